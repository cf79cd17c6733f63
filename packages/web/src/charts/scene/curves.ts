import { bisector } from 'd3-array';
import type { ChartPoint, ChartSeries, Look } from './chart-data';
import { mixed } from './colours';
import { evened } from './geometry';
import type { Mark, PathMark, Place } from './marks';

/** How each option's curve is broken, so that hue is not needed to tell them apart. */
const dashes: readonly (readonly number[])[] = [
  [],
  [11, 5],
  [2, 4],
  [12, 4, 2, 4],
  [6, 3],
  [16, 4, 2, 4, 2, 4],
];

export interface Curve {
  series: ChartSeries;
  places: readonly Place[];
}

/** The front lies under the curves as a broad band. */
export const frontMark = (points: readonly Place[], { colours }: Look): Mark => ({
  kind: 'path',
  points: evened(points, knots),
  smooth: true,
  stroke: mixed(colours.brassSoft, colours.brass, 0.24),
  width: 11,
});

export function curveMarks({ series, places }: Curve, look: Look): Mark[] {
  const stroke = hueOf(series, look);
  const dash = dashes[series.position % dashes.length] as readonly number[];
  const width = series.emphasised ? 3.25 : 2.25;
  const broken = dash.length > 0 ? { dash } : {};
  const turn = series.end === null ? places.length : sizeIndex(series.points, series.end.size + 1);
  const [kept, beyond] = [places.slice(0, turn), places.slice(Math.max(0, turn - 1))];
  return [
    ...pathMarks(beyond, { stroke, width: 1.1, ...broken }),
    ...pathMarks(kept, { stroke, width, ...broken }),
  ];
}

/**
 * Whole participants and clusters make a fine staircase of every curve. Seen from afar it is evened over this many
 * pixels; zoomed in, its steps appear.
 */
const knots = 22;

function pathMarks(places: readonly Place[], style: Omit<PathMark, 'kind' | 'points'>): Mark[] {
  if (places.length < 2) return [];
  return [{ kind: 'path', points: evened(places, knots), smooth: true, ...style }];
}

const sizeIndex = bisector(({ size }: ChartPoint) => size).left;

export interface End {
  series: ChartSeries;
  label: string;
  at: Place;
  /** The next place of the curve. */
  along: Place;
}

/** Where a curve leaves the limits, if that is between two of its sizes. */
export function endOf({ series, places }: Curve): End[] {
  if (!series.end) return [];
  const turn = sizeIndex(series.points, series.end.size + 1);
  const [at, along] = [places[turn - 1], places[turn]];
  return at && along ? [{ series, label: series.end.label, at, along }] : [];
}

/** A bar across the curve. */
export function endMark([x, y]: Place, [nextX, nextY]: Place, { colours }: Look): Mark {
  const length = Math.hypot(nextX - x, nextY - y) || 1;
  const [across, up] = [(-7 * (nextY - y)) / length, (7 * (nextX - x)) / length];
  return {
    kind: 'line',
    from: [x + across, y + up],
    to: [x - across, y - up],
    stroke: colours.text,
    width: 2,
  };
}

export const hueOf = ({ position }: ChartSeries, { colours }: Look): string =>
  colours.options[position % colours.options.length] as string;
