import { exactMoney } from '../../../shared/format/money';
import { count, months, power } from '../../../shared/format/numbers';
import { familyUiOf } from '../../designs/families/registry';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import type { SizePoint } from './axes';
import type { Drawn, Picture } from './picture';

/** What the size of an option counts, in words: “Catchments in each arm”. */
export function sizeNoun({ family, plan, words }: Weighed, { asked }: Pick<Picture, 'asked'>): string {
  const face = familyUiOf(family);
  if (asked.over === 'units') return face.sizeNoun(plan, words);
  return `${words.participants.many} in each ${words.clusters.one}`;
}

/** What one size of an option means, line by line. */
export function pointInWords(
  option: Weighed,
  point: SizePoint,
  picture: Picture,
  weighing: Weighing,
): string[] {
  const { up } = picture;
  const extra = up.kind === 'power' ? undefined : up.of(point, option.request);
  const { participants, clusters, cost } = point;
  return [
    `${option.letter} ${option.name}`,
    `${sizeNoun(option, picture)}: ${count(point.size)}`,
    `Power ${power(point.power)}`,
    ...(extra === undefined ? [] : [`${up.label}: ${up.tell(extra)}`]),
    [
      ...(cost === undefined ? [] : [exactMoney(cost, weighing.currency)]),
      ...(point.months === undefined ? [] : [`${months(point.months)} months`]),
    ].join(' · '),
    [
      ...(clusters === undefined ? [] : [`${count(clusters)} ${option.words.clusters.many}`]),
      `${count(participants)} ${option.words.participants.many}`,
    ].join(' · '),
  ].filter((line) => line !== '');
}

const rowsEach = 7;

export interface SizeRow {
  option: Weighed;
  point: SizePoint;
  now: boolean;
  within: boolean;
}

/** A few sizes of each option spread along its curve, and the one it has. */
export function sizeRows({ drawn }: Picture): SizeRow[] {
  return drawn.flatMap(({ option, curve, now }) => {
    const { points } = curve;
    const spread = Array.from(
      { length: rowsEach },
      (_, step) => points[Math.round((step * (points.length - 1)) / (rowsEach - 1))] as SizePoint,
    );
    const chosen = [...spread.filter(({ size }) => size !== now?.size), ...(now ? [now] : [])];
    const unique = chosen.filter(
      (point, index) => chosen.findIndex(({ size }) => size === point.size) === index,
    );
    return unique.sort((a, b) => a.size - b.size).map((point) => rowOf({ option, curve, now }, point));
  });
}

const rowOf = ({ option, curve, now }: Drawn, point: SizePoint): SizeRow => ({
  option,
  point,
  now: point === now,
  within: !curve.end || point.size <= curve.end.size,
});
