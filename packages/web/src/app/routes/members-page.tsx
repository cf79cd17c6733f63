import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { sessionQuery } from '../../features/access/api/access';
import { Members } from '../../features/members/components/members';
import { MembersSkeleton } from '../../features/members/components/members-skeleton';
import { studiesQuery, studyQuery } from '../../features/studies/api/studies';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { paths } from '../paths';
import { useDeparture } from '../use-departure';

export function MembersPage() {
  const { studyId = '' } = useParams();
  const queryClient = useQueryClient();
  const depart = useDeparture();
  const { data: person } = useQuery(sessionQuery());
  const { data: study } = useQuery(studyQuery(studyId));

  const leave = () =>
    depart(paths.studies, () => {
      queryClient.removeQueries({ queryKey: studyQuery(studyId).queryKey });
      void queryClient.invalidateQueries({ queryKey: studiesQuery().queryKey });
    });
  return (
    <PageBody heading="Members" sub="Who is in this study, and what each of them may do.">
      <title>{`Members · ${study ? `${study.name} · ` : ''}Steelyard`}</title>
      <QueryBoundary key={studyId} what="list of members" skeleton={<MembersSkeleton />}>
        <Members
          studyId={studyId}
          personId={person?.id ?? ''}
          mayChange={study?.role === 'methodologist'}
          onLeft={leave}
        />
      </QueryBoundary>
    </PageBody>
  );
}
