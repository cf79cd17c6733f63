import type { CostSheet, Feasible, Timeline } from '@steelyard/calc';
import { exactMoney, money } from '../../../shared/format/money';
import { count, figure, months } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import { TitledSection } from '../../../shared/ui/titled-section';
import { lineName } from '../model/naming';

interface CostsProps {
  costs: CostSheet;
  size: Feasible;
  arms: readonly string[];
  currency: string;
}

/** What an option costs, by arm and by line of the cost plan. */
export function CostsOfOption({ costs, size, arms, currency }: CostsProps) {
  const short = (amount: number) => money(amount, currency);
  const exact = (amount: number) => exactMoney(amount, currency);
  const sum = (of: 'direct' | 'shared') => costs.arms.reduce((total, arm) => total + arm[of], 0);
  return (
    <>
      <TitledSection level={3} title="Cost by arm">
        <DataTable
          label="Cost by arm"
          totalled
          columns={[
            { label: 'Arm' },
            { label: 'Direct', figures: true },
            { label: 'Shared', figures: true },
            { label: 'Total', figures: true },
          ]}
          rows={[
            ...costs.arms.map(({ label, direct, shared, total }, arm) => ({
              key: label,
              cells: [arms[arm] ?? label, short(direct), short(shared), short(total)],
            })),
            {
              key: 'total',
              cells: ['Together', short(sum('direct')), short(sum('shared')), short(costs.total)],
            },
          ]}
        />
      </TitledSection>
      <TitledSection level={3} title="Cost by line">
        <DataTable
          label="Cost by line"
          totalled
          columns={[
            { label: 'Line' },
            { label: 'Quantity × rate', figures: true },
            { label: 'Amount', figures: true },
          ]}
          rows={[
            ...costs.lines.map((line) => ({
              key: line.label,
              cells: [
                lineName(line, size, arms),
                `${figure(line.quantity, 4)} × ${count(line.rate)}`,
                exact(line.amount),
              ],
            })),
            { key: 'total', cells: ['Total', '', exact(costs.total)] },
          ]}
        />
      </TitledSection>
    </>
  );
}

export function MonthsOfOption({ timeline }: { timeline: Timeline }) {
  return (
    <TitledSection level={3} title="Months by phase">
      <DataTable
        label="Months by phase"
        totalled
        columns={[
          { label: 'Phase' },
          { label: 'From', figures: true },
          { label: 'To', figures: true },
          { label: 'Months', figures: true },
        ]}
        rows={[
          ...timeline.phases.map(({ label, from, to }) => ({
            key: label,
            cells: [label, months(from), months(to), months(to - from)],
          })),
          { key: 'total', cells: ['Start to end', '', '', months(timeline.months)] },
        ]}
      />
    </TitledSection>
  );
}
