import { extent } from 'd3-array';
import type { ChartData, ChartRule, ChartSeries } from '../../../charts/scene/chart-data';
import { money } from '../../../shared/format/money';
import { percent } from '../../../shared/format/numbers';
import { limitChips } from '../../weigh/model/standing-words';
import type { Weighed, Weighing } from '../../weigh/model/weighing';
import {
  type Across,
  type AcrossAxis,
  acrossAxes,
  type Over,
  type SizePoint,
  targetAt,
  type Up,
  type UpAxis,
  upAxes,
} from './axes';
import { type Asked, curveOf, type KnownCurves, type OptionCurve, pointNow } from './curves';
import { frontOfPairs } from './pareto';

/** What a person chose to see. */
export interface Choice {
  over: Over;
  across: Across;
  up: Up;
}

/** An option that has a curve, with its size now where it has one. */
export interface Drawn {
  option: Weighed;
  curve: OptionCurve;
  now: SizePoint | undefined;
}

export interface Picture {
  asked: Asked;
  across: AcrossAxis;
  up: UpAxis;
  /** What else could be drawn. */
  choices: { across: AcrossAxis[]; up: UpAxis[]; over: boolean };
  drawn: Drawn[];
  data: ChartData;
}

/** The options' curves on the chosen axes; an axis that nothing is known on gives way to one that is. */
export function pictureOf(
  weighing: Weighing,
  choice: Choice,
  emphasised: string | undefined,
  known: KnownCurves,
): Picture {
  const { options, hold, limits, study } = weighing;
  const sized = options.some(({ request }) => 'clusterSize' in request.design);
  const over = sized ? choice.over : 'units';
  const superiority = study.plan.test.hypothesis === 'superiority';
  const upChoices = Object.values(upAxes(weighing)).filter(
    ({ kind }) => kind !== 'detectable' || superiority,
  );
  const up = (upChoices.find(({ kind }) => kind === choice.up) ?? upChoices[0]) as UpAxis;
  const asked: Asked = { over, up: up.kind, power: hold.power, limits: limits.limits };
  const curves = options.flatMap((option) => {
    const curve = curveOf(option, asked, known);
    return curve && curve.points.length > 0 ? [{ option, curve }] : [];
  });
  const acrossChoices = Object.values(acrossAxes(weighing)).filter(
    (axis) =>
      axis.kind !== (over === 'units' ? 'clusterSize' : 'clusters') &&
      curves.some(({ option, curve }) =>
        curve.points.some((point) => (axis.of(point, option.request) ?? 0) > 0),
      ),
  );
  const across = (acrossChoices.find(({ kind }) => kind === choice.across) ??
    acrossChoices[0] ??
    acrossAxes(weighing).participants) as AcrossAxis;
  const drawn = curves
    .filter(({ option, curve }) =>
      curve.points.some((point) => across.of(point, option.request) !== undefined),
    )
    .map(({ option, curve }): Drawn => ({ option, curve, now: pointNow(option, asked, known) }));
  return {
    asked,
    across,
    up,
    choices: { across: acrossChoices, up: upChoices, over: sized },
    drawn,
    data: dataOf(weighing, { across, up }, drawn, emphasised),
  };
}

interface Axes {
  across: AcrossAxis;
  up: UpAxis;
}

function dataOf(weighing: Weighing, axes: Axes, drawn: Drawn[], emphasised: string | undefined): ChartData {
  const { across, up } = axes;
  const series = drawn.map((each) => seriesOf(each, weighing, axes, each.option.id === emphasised));
  const points = series.flatMap((each) => each.points);
  const rules = rulesOf(weighing, axes);
  const yRange = extent(points, ({ y }) => y) as [number, number];
  return {
    x: {
      title: across.label,
      domain: padded(
        points.map(({ x }) => x),
        rules,
        'x',
      ),
      format: across.tick,
      whole: across.whole,
    },
    y: {
      title: up.label,
      domain:
        up.kind === 'power'
          ? [Math.min(0.9, Math.floor(10 * yRange[0]) / 10), 1]
          : padded(
              points.map(({ y }) => y),
              rules,
              'y',
            ),
      format: up.tick,
      whole: false,
    },
    series,
    rules,
    front: frontOf(drawn, axes),
  };
}

function seriesOf(
  { option, curve, now }: Drawn,
  weighing: Weighing,
  axes: Axes,
  emphasised: boolean,
): ChartSeries {
  const placed = (point: SizePoint) => {
    const [x, y] = [axes.across.of(point, option.request), axes.up.of(point, option.request)];
    return x === undefined || y === undefined ? [] : [{ size: point.size, x, y }];
  };
  const { id, letter, name, position, ruling } = option;
  const { end } = curve;
  const says = limitChips(weighing).find(({ limit }) => limit === end?.limit)?.says ?? '';
  return {
    id,
    letter,
    name,
    position,
    outlined: ruling?.kind === 'not-admissible',
    emphasised,
    points: curve.points.flatMap(placed),
    now: (now && placed(now)[0]) ?? null,
    end: end && { size: end.size, label: says },
  };
}

/** What is held, asked for and limited, where the drawn axes show it. */
function rulesOf(weighing: Weighing, { across, up }: Axes): ChartRule[] {
  const { hold, limits, currency, study, options } = weighing;
  const rules: ChartRule[] = [];
  if (up.kind === 'power') {
    const label = `${hold.kind === 'power' ? 'hold' : 'asked for'}: ${percent(hold.power)}`;
    rules.push({ axis: 'y', at: hold.power, label, barred: 'below', dashed: false });
  }
  if (up.kind === 'detectable') {
    const { at } = targetAt(study.plan);
    const barred = up.more ? 'below' : 'above';
    rules.push({ axis: 'y', at, label: `target: ${up.tell(at)}`, barred, dashed: false });
  }
  if (across.kind === 'cost' && hold.kind === 'budget') {
    const label = `budget ${money(hold.budget, currency)}`;
    rules.push({ axis: 'x', at: hold.budget, label, barred: 'above', dashed: false });
  }
  const most = across.limit && limits.limits[across.limit];
  // Limits are of those recruited: where whole clusters or participants are lost, the curves' own ends tell.
  const lost = options.some(
    ({ request: { attrition } }) =>
      (across.kind === 'clusters' && attrition?.units) ||
      (across.kind === 'clusterSize' && attrition?.participants),
  );
  if (most !== undefined && !lost) {
    rules.push({ axis: 'x', at: most, label: `over ${across.tell(most)}`, barred: 'above', dashed: true });
  }
  return rules;
}

/** From the least to the most, and on to a rule that is not far off. */
function padded(values: readonly number[], rules: readonly ChartRule[], axis: 'x' | 'y'): [number, number] {
  const [least = 0, most = 1] = extent(values);
  const span = most - least || Math.abs(most) || 1;
  const near = rules
    .filter((rule) => rule.axis === axis && rule.at > least - 0.4 * span && rule.at < most + 0.4 * span)
    .map(({ at }) => at);
  const [from, to] = [Math.min(least, ...near), Math.max(most, ...near)];
  const room = 0.04 * (to - from || span);
  return [Math.max(0, from - room), to + room];
}

/** Stretches of the curves on which no other size of any option is better on one drawn axis and as good on the other. */
function frontOf(drawn: readonly Drawn[], { across, up }: Axes): ChartData['front'] {
  const admitted = drawn.filter(({ option }) => option.ruling?.kind !== 'not-admissible');
  if (admitted.length < 2) return [];
  const curves = admitted.map(({ option: { request }, curve: { points, end } }) =>
    points.flatMap((point) => {
      const [x, y] = [across.of(point, request), up.of(point, request)];
      if (x === undefined || y === undefined || (end && point.size > end.size)) return [];
      return [[x, y] as const];
    }),
  );
  const front = frontOfPairs(curves.flat(), ([x, y]) => [x, up.more ? -y : y]);
  return curves.flatMap((points) => {
    const stretches: (readonly [number, number])[][] = [[]];
    for (const point of points) {
      if (front.has(point)) stretches.at(-1)?.push(point);
      else if (stretches.at(-1)?.length) stretches.push([]);
    }
    return stretches.filter(({ length }) => length > 1);
  });
}
