import { makeStyles, tokens } from '@fluentui/react-components';
import { Outlet, useParams } from 'react-router-dom';
import { MainRegion } from '../../shared/ui/main-region';
import { SideList } from './side-list';

const useStyles = makeStyles({
  frame: {
    display: 'grid',
    gridTemplateColumns: '188px minmax(0, 1fr)',
    minHeight: 'calc(100vh - 48px)',
    '@media (max-width: 900px)': { display: 'block' },
    '@media print': { display: 'block' },
  },
  page: {
    borderLeft: `1px solid ${tokens.colorNeutralStroke2}`,
    '@media (max-width: 900px)': { borderLeftStyle: 'none' },
    '@media print': { borderLeftStyle: 'none' },
  },
});

/** A study's pages beside the list of them. */
export function StudyFrame() {
  const styles = useStyles();
  const { studyId = '' } = useParams();
  return (
    <div className={styles.frame}>
      <SideList studyId={studyId} />
      <MainRegion className={styles.page}>
        <Outlet />
      </MainRegion>
    </div>
  );
}
