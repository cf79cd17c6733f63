import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { studyHistoryQuery } from '../../features/history/api/history';
import { History } from '../../features/history/components/history';
import { HistorySkeleton } from '../../features/history/components/history-skeleton';
import { studyQuery } from '../../features/studies/api/studies';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';

export function HistoryPage() {
  const { studyId = '' } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  return (
    <PageBody
      heading="History"
      sub="Who changed what and when, newest first, with what it was before and after."
    >
      <title>{`History · ${study ? `${study.name} · ` : ''}Steelyard`}</title>
      <QueryBoundary key={studyId} what="history" skeleton={<HistorySkeleton />}>
        <History
          query={studyHistoryQuery(studyId)}
          label="Changes"
          treatments={study?.treatments.map(({ name }) => name)}
          empty="Nothing has been changed in this study yet."
        />
      </QueryBoundary>
    </PageBody>
  );
}
