import { shortDate } from '../../../shared/format/times';
import { DataTable } from '../../../shared/ui/data-table';
import { Word } from '../../../shared/ui/words';
import type { Assumption } from '../../weigh/model/assumptions';

const columns = [
  { label: 'Planning value' },
  { label: 'Taken', figures: true },
  { label: 'Ledger', figures: true },
  { label: 'Range' },
  { label: 'Source' },
  { label: 'Set by' },
];

/** Every planning value the figures rest on, with its ledger line in full. */
export function AssumptionsTable({ assumptions }: { assumptions: readonly Assumption[] }) {
  return (
    <DataTable
      label="Planning values"
      scrolls
      columns={columns}
      rows={assumptions.map(({ key, label, used, ledger, reason }) => ({
        key,
        cells: [
          <>
            {label}
            {reason && (
              <>
                {' '}
                (<Word is="override">override</Word>: {reason})
              </>
            )}
          </>,
          used,
          ledger?.value ?? '–',
          ledger?.range ?? '–',
          ledger?.source ?? '–',
          ledger ? `${ledger.setBy}, ${shortDate(ledger.setAt)}` : '–',
        ],
      }))}
    />
  );
}
