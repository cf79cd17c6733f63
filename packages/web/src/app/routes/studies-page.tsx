import { makeStyles } from '@fluentui/react-components';
import { useQuery, useSuspenseQuery } from '@tanstack/react-query';
import { sessionQuery } from '../../features/access/api/access';
import { studiesQuery } from '../../features/studies/api/studies';
import { NoStudies } from '../../features/studies/components/no-studies';
import { StudyList, StudyListSkeleton } from '../../features/studies/components/study-list';
import { MainRegion } from '../../shared/ui/main-region';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { PrimaryLink } from '../../shared/ui/text-link';
import { Word } from '../../shared/ui/words';
import { paths } from '../paths';

const useStyles = makeStyles({ start: { marginBottom: '14px' } });

export function StudiesPage() {
  const styles = useStyles();
  return (
    <MainRegion>
      <title>Studies · Steelyard</title>
      <PageBody
        heading="Studies"
        sub={
          <>
            Each <Word is="study">study</Word> you are a member of.
          </>
        }
      >
        <p className={styles.start}>
          <PrimaryLink to={paths.newStudy}>New study</PrimaryLink>
        </p>
        <QueryBoundary what="list of studies" skeleton={<StudyListSkeleton />}>
          <Studies />
        </QueryBoundary>
      </PageBody>
    </MainRegion>
  );
}

function Studies() {
  const { data: studies } = useSuspenseQuery(studiesQuery());
  const { data: person } = useQuery(sessionQuery());
  if (studies.length === 0) return <NoStudies administrator={person?.administrator ?? false} />;
  return <StudyList studies={studies} hrefOf={({ id }) => paths.weigh(id)} />;
}
