import type { Weighing } from '../../weigh/model/weighing';
import type { UpAxis } from './axes';
import type { Picture } from './picture';
import { sizeNoun } from './sizes-table';

type Cell = string | number | undefined;

/** Every point of every curve as comma-separated values, proportions as such, units in the heads. */
export function sizesCsv(picture: Picture, { currency, study }: Weighing): string {
  const { drawn, up } = picture;
  const heads = [
    'Option',
    'Name',
    'Size counts',
    'Size',
    'Power (proportion)',
    ...(up.kind === 'power'
      ? []
      : [headOf(up, study.plan.outcome.kind === 'binary' ? 'proportion' : study.outcomeUnit)]),
    `${study.participants.many} analysed`,
    `${study.clusters?.many ?? 'clusters'} analysed`,
    `Cost (${currency})`,
    'Months',
    'Within the limits',
    'Size now',
  ];
  const rows = drawn.flatMap(({ option, curve, now }) => {
    const points = curve.points.filter(({ size }) => size !== now?.size);
    return [...points, ...(now ? [now] : [])]
      .sort((a, b) => a.size - b.size)
      .map((point): Cell[] => [
        option.letter,
        option.name,
        sizeNoun(option, picture),
        point.size,
        rounded(point.power),
        ...(up.kind === 'power' ? [] : [rounded(up.of(point, option.request))]),
        point.participants,
        point.clusters,
        rounded(point.cost),
        rounded(point.months),
        !curve.end || point.size <= curve.end.size ? 'yes' : 'no',
        point === now ? 'yes' : 'no',
      ]);
  });
  return `\ufeff${[heads, ...rows].map((row) => row.map(cellText).join(',')).join('\r\n')}\r\n`;
}

const headOf = ({ label, kind }: UpAxis, unit: string): string =>
  kind === 'halfWidth' || !unit ? label : `${label} (${unit})`;

const rounded = (value: number | undefined): number | undefined =>
  value === undefined ? undefined : Number(value.toPrecision(12));

/** Text is quoted, and none can be taken for a formula by a spreadsheet. */
function cellText(cell: Cell): string {
  if (typeof cell === 'number') return String(cell);
  if (cell === undefined) return '';
  const safe = /^[=+\-@\t\r]/.test(cell) ? `'${cell}` : cell;
  return `"${safe.replaceAll('"', '""')}"`;
}
