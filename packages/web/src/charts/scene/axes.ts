import { type ScaleLinear, scaleLinear } from 'd3-scale';
import type { ChartAxis, ChartData, Look, View } from './chart-data';
import type { Box, Mark } from './marks';

export const textSize = 13;
const lineHeight = 18;

export type Scale = ScaleLinear<number, number>;

export interface Frame {
  plot: Box;
  x: Scale;
  y: Scale;
  ticks: { x: Tick[]; y: Tick[] };
}

interface Tick {
  at: number;
  label: string;
}

/** The plot's place, its two scales as they are zoomed, and their ticks. */
export function frameOf(
  data: ChartData,
  { width, height }: { width: number; height: number },
  view: View,
  look: Look,
): Frame {
  const top = lineHeight + 8;
  const bottom = height - 2 * lineHeight - 8;
  const y = zoomed(data.y.domain, [bottom - top, 0], { k: view.k, shift: view.y }).range([bottom, top]);
  const many = Math.max(2, (bottom - top) / 44);
  const yTicks = ticksOf(y, data.y, many);
  // Room for the ticks of the whole picture too, so that the plot keeps its place while it is zoomed.
  const labels = [...yTicks, ...ticksOf(scaleLinear(data.y.domain, [bottom, top]), data.y, many)];
  const left = Math.ceil(Math.max(28, ...labels.map(({ label }) => look.measure(label, textSize, 400)))) + 10;
  const right = width - 12;
  const plot = { x: left, y: top, width: Math.max(40, right - left), height: Math.max(40, bottom - top) };
  const x = zoomed(data.x.domain, [0, plot.width], { k: view.k, shift: view.x }).range([
    plot.x,
    plot.x + plot.width,
  ]);
  return { plot, x, y, ticks: { x: apart(x, data.x, plot.width, look), y: yTicks } };
}

function zoomed(
  domain: readonly [number, number],
  range: [number, number],
  by: { k: number; shift: number },
) {
  const whole = scaleLinear(domain, range);
  return scaleLinear(
    range.map((at) => whole.invert((at - by.shift) / by.k)),
    range,
  );
}

function ticksOf(scale: Scale, { format, whole }: ChartAxis, count: number): Tick[] {
  return scale
    .ticks(count)
    .filter((value) => !whole || Number.isInteger(value))
    .map((value) => ({ at: scale(value), label: format(value) }));
}

/** As many ticks across as their labels leave room for. */
function apart(scale: Scale, axis: ChartAxis, width: number, look: Look): Tick[] {
  for (let count = Math.max(2, Math.floor(width / 90)); count > 1; count -= 1) {
    const ticks = ticksOf(scale, axis, count);
    const widths = ticks.map(({ label }) => look.measure(label, textSize, 400));
    const free = ticks.every(({ at }, index) => {
      const next = ticks[index + 1];
      return !next || next.at - at > ((widths[index] as number) + (widths[index + 1] as number)) / 2 + 14;
    });
    if (free && new Set(ticks.map(({ label }) => label)).size === ticks.length) return ticks;
  }
  return ticksOf(scale, axis, 1).slice(0, 1);
}

/** Grid lines across, tick labels, and what each axis counts. */
export function axisMarks({ x, y }: ChartData, { plot, ticks }: Frame, { colours, measure }: Look): Mark[] {
  const [right, bottom] = [plot.x + plot.width, plot.y + plot.height];
  const text = { kind: 'text', size: textSize, weight: 400, fill: colours.muted } as const;
  const grid = ticks.y.map(({ at }): Mark => {
    return { kind: 'line', from: [plot.x, at], to: [right, at], stroke: colours.line, width: 1 };
  });
  return [
    ...grid,
    { kind: 'line', from: [plot.x, bottom], to: [right, bottom], stroke: colours.edge, width: 1 },
    ...ticks.x.map(({ at }): Mark => {
      return { kind: 'line', from: [at, bottom], to: [at, bottom + 5], stroke: colours.edge, width: 1 };
    }),
    ...ticks.y.map(({ at, label }): Mark => {
      return { ...text, at: [plot.x - 8, at], text: label, align: 'end' };
    }),
    ...ticks.x.map(({ at, label }): Mark => {
      const half = measure(label, textSize, 400) / 2;
      const centre = Math.min(Math.max(at, half), right + 12 - half);
      return { ...text, at: [centre, bottom + 17], text: label, align: 'middle' };
    }),
    { ...text, at: [2, 11], text: y.title, align: 'start', weight: 700 },
    { ...text, at: [right, bottom + 17 + lineHeight], text: x.title, align: 'end', weight: 700 },
  ];
}
