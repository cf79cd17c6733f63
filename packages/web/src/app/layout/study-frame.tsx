import { makeStyles, tokens } from '@fluentui/react-components';
import { useQuery } from '@tanstack/react-query';
import { Outlet, useParams } from 'react-router-dom';
import { studyQuery } from '../../features/studies/api/studies';
import { ApiError } from '../../shared/api/client';
import { MainRegion } from '../../shared/ui/main-region';
import { ClosedStudy } from './closed-study';
import { SideList } from './side-list';

const useStyles = makeStyles({
  frame: {
    display: 'grid',
    gridTemplateColumns: '172px minmax(0, 1fr)',
    minHeight: 'calc(100vh - 48px)',
    '@media (max-width: 900px)': { display: 'block' },
    '@media (min-width: 1760px)': { gridTemplateColumns: '216px minmax(0, 1fr)' },
    '@media print': { display: 'block', minHeight: 0 },
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
  const { data: study, error } = useQuery(studyQuery(studyId));
  if (study && error instanceof ApiError && error.status === 404) {
    return (
      <MainRegion>
        <ClosedStudy name={study.name} />
      </MainRegion>
    );
  }
  return (
    <div className={styles.frame}>
      <SideList studyId={studyId} />
      <MainRegion className={styles.page}>
        <Outlet />
      </MainRegion>
    </div>
  );
}
