import { makeStyles } from '@fluentui/react-components';
import { Link, Outlet, useParams } from 'react-router-dom';
import { Brand } from '../../shared/ui/brand';
import { mainId } from '../../shared/ui/main-region';
import { onBar, ownTokens } from '../../shared/ui/own-tokens';
import { paths } from '../paths';
import { AccountMenu } from './account-menu';
import { StudyPeople } from './study-people';
import { StudyTrail } from './study-trail';

const useStyles = makeStyles({
  skip: {
    position: 'absolute',
    left: '12px',
    top: '-60px',
    zIndex: 3,
    padding: '8px 14px',
    borderRadius: '6px',
    backgroundColor: onBar.brass,
    color: '#101a29',
    fontWeight: 700,
    ':focus': { top: '8px' },
  },
  bar: {
    position: 'sticky',
    top: 0,
    zIndex: 2,
    display: 'flex',
    alignItems: 'center',
    gap: '14px',
    height: '48px',
    paddingInline: '20px 16px',
    backgroundColor: ownTokens.bar,
    color: onBar.text,
    '@media (max-width: 640px)': { paddingInline: '12px 8px', gap: '10px' },
    '@media print': { display: 'none' },
  },
  home: {
    color: 'inherit',
    textDecorationLine: 'none',
    borderRadius: '4px',
    ':focus-visible': { outline: `2px solid ${onBar.text}`, outlineOffset: '3px' },
  },
  space: { flexGrow: 1 },
});

/** The bar over every page of a person who is signed in. */
export function AppFrame() {
  const styles = useStyles();
  const { studyId } = useParams();
  return (
    <>
      <a href={`#${mainId}`} className={styles.skip}>
        Skip to the main content
      </a>
      <header className={styles.bar}>
        <Link to={paths.studies} className={styles.home} aria-label="Steelyard, your studies">
          <Brand />
        </Link>
        {studyId && <StudyTrail studyId={studyId} />}
        <span className={styles.space} />
        {studyId && <StudyPeople studyId={studyId} />}
        <AccountMenu />
      </header>
      <Outlet />
    </>
  );
}
