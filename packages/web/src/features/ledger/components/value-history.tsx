import type { PlanningValueView } from '@steelyard/api/contract/studies';
import { useSuspenseQuery } from '@tanstack/react-query';
import { DataTable } from '../../../shared/ui/data-table';
import { Moment } from '../../../shared/ui/moment';
import { QueryBoundary } from '../../../shared/ui/query-boundary';
import { Skeleton, SkeletonItem } from '../../../shared/ui/skeleton';
import { planningValueHistoryQuery } from '../api/ledger';
import { type Line, rangeOf } from '../model/lines';

interface ValueHistoryProps {
  studyId: string;
  line: Line & { stored: PlanningValueView };
  show: (value: number) => string;
}

/** Every version of a planning value, newest first. */
export function ValueHistory(props: ValueHistoryProps) {
  return (
    <QueryBoundary
      what="history of this value"
      skeleton={
        <Skeleton aria-label="Loading the history">
          <SkeletonItem size={48} />
        </Skeleton>
      }
    >
      <Versions {...props} />
    </QueryBoundary>
  );
}

function Versions({ studyId, line, show }: ValueHistoryProps) {
  const { data: entries } = useSuspenseQuery(planningValueHistoryQuery(studyId, line.stored));
  if (entries.length === 0) return <p>No earlier version of this value is kept.</p>;
  return (
    <DataTable
      label={`History of ${line.label}`}
      scrolls
      columns={[
        { label: 'Value', figures: true },
        { label: 'Range' },
        { label: 'Source' },
        { label: 'Set by' },
        { label: 'When' },
      ]}
      rows={entries.map((entry) => ({
        key: String(entry.version),
        cells: [
          show(entry.value),
          rangeOf(entry, show) ?? 'no range',
          entry.source,
          entry.setBy,
          <Moment key="when" iso={entry.setAt} />,
        ],
      }))}
    />
  );
}
