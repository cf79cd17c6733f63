import { exactMoney } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import { scheduleInWords } from '../../designs/components/schedule';
import { familyUiOf } from '../../designs/families/registry';
import { standingInWords } from '../model/standing-words';
import type { Weighed, Weighing } from '../model/weighing';

const columns = [
  { label: 'Option' },
  { label: 'Schedule' },
  { label: 'Analysed', figures: true },
  { label: 'Recruited', figures: true },
  { label: 'Power', figures: true },
  { label: 'Cost by arm' },
  { label: 'Cost', figures: true },
  { label: 'Months', figures: true },
  { label: 'Against the limits' },
];

/** The beams and schedules as exact figures and words. */
export function BeamsTable({ weighing }: { weighing: Weighing }) {
  return (
    <DataTable
      label="Options as a table"
      scrolls
      columns={columns}
      rows={weighing.options.map((option) => ({ key: option.id, cells: cellsOf(option, weighing) }))}
    />
  );
}

function cellsOf(option: Weighed, weighing: Weighing): string[] {
  const { letter, name, family, plan, words, appraisal, error } = option;
  const { currency } = weighing;
  const schedule = scheduleInWords(familyUiOf(family).schematic(plan, words), words.arms);
  const title = `${letter} ${name}`;
  if (!appraisal?.feasible) {
    const message = error?.message ?? appraisal?.infeasible.message ?? '';
    return [title, schedule, '–', '–', '–', message, '–', '–', '–'];
  }
  const { participants, recruited, costs, timeline } = appraisal;
  const told = standingInWords(option, weighing);
  const byArm = costs?.arms.map(
    ({ label, total }, arm) => `${words.arms[arm] ?? label} ${exactMoney(total, currency)}`,
  );
  return [
    title,
    schedule,
    count(participants),
    count(recruited),
    power(appraisal.power),
    byArm?.join('; ') ?? '–',
    costs ? exactMoney(costs.total, currency) : '–',
    timeline ? months(timeline.months) : '–',
    told ? [told.what, ...told.more].join('; ') : '–',
  ];
}
