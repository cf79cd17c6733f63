import type { Feasible } from '@steelyard/calc';
import { figure, percent, power } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import { Facts } from '../../../shared/ui/facts';

/** What is compared with what, and how likely each and all of it is to be shown. */
export function ComparisonsTable({ size, arms }: { size: Feasible; arms: readonly string[] }) {
  const { comparisons, alphaPerComparison, criticalValue, disjunctivePower, conjunctivePower } = size;
  return (
    <>
      <DataTable
        label="Comparisons"
        columns={[
          { label: 'Comparison' },
          { label: 'Effect', figures: true },
          { label: 'Standard error', figures: true },
          { label: 'Power', figures: true },
        ]}
        rows={comparisons.map(({ arm, versus, effect, standardError, power: each }) => ({
          key: `${arm}-${versus}`,
          cells: [
            `${arms[arm] ?? `Arm ${arm}`} against ${arms[versus] ?? `arm ${versus}`}`,
            figure(effect),
            figure(standardError),
            power(each),
          ],
        }))}
      />
      <Facts
        facts={[
          ...(alphaPerComparison === undefined
            ? []
            : [{ name: 'Type I error of each comparison', value: percent(alphaPerComparison, 3) }]),
          { name: 'Critical value', value: figure(criticalValue) },
          ...(disjunctivePower === undefined
            ? []
            : [{ name: 'Power for at least one', value: power(disjunctivePower) }]),
          ...(conjunctivePower === undefined
            ? []
            : [{ name: 'Power for all together', value: power(conjunctivePower) }]),
        ]}
      />
    </>
  );
}
