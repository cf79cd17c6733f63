import { exactMoney } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { DataTable } from '../../../shared/ui/data-table';
import { scheduleInWords } from '../../designs/components/schedule';
import { familyUiOf } from '../../designs/families/registry';
import { differenceFrom, sizeOf } from '../model/against';
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
export function BeamsTable({
  weighing,
  reference,
}: {
  weighing: Weighing;
  /** With one, a column tells each option against it. */
  reference: Weighed | undefined;
}) {
  const exact = (amount: number) => exactMoney(amount, weighing.currency);
  const against = (option: Weighed) => (reference ? [differenceInWords(option, reference, exact)] : []);
  return (
    <DataTable
      label="Options as a table"
      scrolls
      columns={reference ? [...columns, { label: `Against ${reference.letter}` }] : columns}
      rows={weighing.options.map((option) => ({
        key: option.id,
        cells: [...cellsOf(option, weighing), ...against(option)],
      }))}
    />
  );
}

function differenceInWords(option: Weighed, reference: Weighed, money: (amount: number) => string): string {
  if (option.id === reference.id) return 'The others are told against this one.';
  return differenceFrom(option, reference, money)?.says ?? '–';
}

function cellsOf(option: Weighed, weighing: Weighing): string[] {
  const { letter, name, family, plan, words, appraisal, error } = option;
  const size = sizeOf(option);
  const { currency } = weighing;
  const schedule = scheduleInWords(familyUiOf(family).schematic(plan, words), words.arms);
  const title = `${letter} ${name}`;
  if (!size) {
    const infeasible = appraisal?.feasible === false ? appraisal.infeasible.message : '';
    const message = error?.message ?? infeasible;
    return [title, schedule, '–', '–', '–', message, '–', '–', '–'];
  }
  const { participants, recruited, costs, timeline } = size;
  const byArm = costs?.arms.map(
    ({ label, total }, arm) => `${words.arms[arm] ?? label} ${exactMoney(total, currency)}`,
  );
  return [
    title,
    schedule,
    count(participants),
    count(recruited),
    power(size.power),
    byArm?.join('; ') ?? '–',
    costs ? exactMoney(costs.total, currency) : '–',
    timeline ? months(timeline.months) : '–',
    standingOf(option, weighing),
  ];
}

function standingOf(option: Weighed, weighing: Weighing): string {
  if (option.ruling?.kind === 'not-admissible') return `Ruled out by ${option.ruling.by}, kept to compare`;
  const told = standingInWords(option, weighing);
  return told ? [told.what, ...told.more].join('; ') : '–';
}
