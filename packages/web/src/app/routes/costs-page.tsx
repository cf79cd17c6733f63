import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Costs } from '../../features/costs/components/costs';
import { studyQuery } from '../../features/studies/api/studies';
import { FormSkeleton } from '../../shared/ui/form-skeleton';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';

export function CostsPage() {
  const { studyId = '' } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  return (
    <PageBody
      heading="Costs"
      sub="What the study spends and how long it takes. The most there is of either is set on Weigh, as a limit."
    >
      <title>{`Costs · ${study ? `${study.name} · ` : ''}Steelyard`}</title>
      <QueryBoundary key={studyId} what="costs" skeleton={<FormSkeleton label="Loading the costs" />}>
        <Costs studyId={studyId} />
      </QueryBoundary>
    </PageBody>
  );
}
