import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Ledger, LedgerSkeleton } from '../../features/ledger/components/ledger';
import { studyQuery } from '../../features/studies/api/studies';
import { PageBody } from '../../shared/ui/page-body';
import { QueryBoundary } from '../../shared/ui/query-boundary';
import { Word } from '../../shared/ui/words';

export function LedgerPage() {
  const { studyId = '' } = useParams();
  const { data: study } = useQuery(studyQuery(studyId));
  return (
    <PageBody
      heading="Ledger"
      sub={
        <>
          Each <Word is="planningValue">planning value</Word>: one assumption, its range and where it comes
          from.
        </>
      }
    >
      <title>{`Ledger · ${study ? `${study.name} · ` : ''}Steelyard`}</title>
      <QueryBoundary key={studyId} what="ledger" skeleton={<LedgerSkeleton />}>
        <Ledger studyId={studyId} />
      </QueryBoundary>
    </PageBody>
  );
}
