import { makeStyles, mergeClasses, tokens } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { OptionTag } from '../../shared/ui/option-tag';
import { ownTokens } from '../../shared/ui/own-tokens';
import { PageLink } from './page-link';
import { type StudyPage, useStudyPages } from './study-pages';

const useStyles = makeStyles({
  list: {
    position: 'sticky',
    top: '48px',
    alignSelf: 'start',
    padding: '16px 8px',
    '@media (max-width: 900px)': { display: 'none' },
    '@media print': { display: 'none' },
  },
  item: {
    display: 'flex',
    alignItems: 'center',
    gap: '9px',
    padding: '7px 10px',
    borderRadius: '6px',
    color: tokens.colorNeutralForeground1,
    textDecorationLine: 'none',
    lineHeight: '18px',
    overflowWrap: 'anywhere',
    ':hover': { backgroundColor: tokens.colorNeutralBackground1 },
    ':focus-visible': { outline: `2px solid ${tokens.colorStrokeFocus2}`, outlineOffset: '-2px' },
  },
  here: {
    backgroundColor: ownTokens.brassSoft,
    boxShadow: `inset 3px 0 ${tokens.colorBrandForeground1}`,
    fontWeight: 700,
    ':hover': { backgroundColor: ownTokens.brassSoft },
  },
  about: { marginTop: '10px', paddingTop: '10px', borderTop: `1px solid ${tokens.colorNeutralStroke2}` },
  heading: {
    padding: '12px 10px 4px',
    color: tokens.colorNeutralForeground2,
    fontSize: '13px',
    lineHeight: '18px',
  },
});

export function SideList({ studyId }: { studyId: string }) {
  const styles = useStyles();
  const pages = useStudyPages(studyId);
  return (
    <nav aria-label="Study" className={styles.list}>
      {pages && (
        <>
          <Pages pages={pages.main} />
          {pages.workings.length > 0 && (
            <p id="workings" className={styles.heading}>
              Working
            </p>
          )}
          <ul aria-labelledby="workings">
            {pages.workings.map(({ id, letter, position, name, ruledOut, path, current }) => (
              <li key={id}>
                <Link
                  to={path}
                  aria-current={current ? 'page' : undefined}
                  className={mergeClasses(styles.item, current && styles.here)}
                >
                  <OptionTag letter={letter} position={position} small outlined={ruledOut} />
                  <span>{name}</span>
                </Link>
              </li>
            ))}
          </ul>
          <div className={styles.about}>
            <Pages pages={pages.about} />
          </div>
        </>
      )}
    </nav>
  );
}

function Pages({ pages }: { pages: readonly StudyPage[] }) {
  const styles = useStyles();
  return pages.map((page) => (
    <PageLink
      key={page.path}
      page={page}
      className={mergeClasses(styles.item, page.current && styles.here)}
    />
  ));
}
