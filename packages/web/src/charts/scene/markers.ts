import type { ChartSeries, Look } from './chart-data';
import { hueOf } from './curves';
import { contains, distance } from './geometry';
import type { Box, Handle, Mark, Place } from './marks';

export const markerRadius = 12;
const apart = 2 * markerRadius + 2;

export interface Marker extends Handle {
  series: ChartSeries;
  /** Zoomed out of sight: it waits at the edge. */
  away: boolean;
}

/** A disc for each option's size now, moved to the nearest free place where another is in its way. */
export function placeMarkers(all: readonly { series: ChartSeries; true: Place }[], plot: Box): Marker[] {
  const placed: Marker[] = [];
  for (const { series, true: place } of all) {
    const away = !contains(plot, place);
    const inner = away ? inset(plot) : plot;
    const wanted = kept(place, inner);
    const at = ring(wanted)
      .map((candidate) => kept(candidate, inner))
      .find((candidate) => placed.every((other) => distance(candidate, other.at) >= apart));
    placed.push({ id: series.id, series, true: place, at: at ?? wanted, away });
  }
  return placed;
}

/** The place itself, then places around it, nearest first. */
function ring([x, y]: Place): Place[] {
  const around = [1, 2, 3].flatMap((step) =>
    [-90, 90, 180, 0, -135, -45, 135, 45].map((angle): Place => {
      const turn = (angle * Math.PI) / 180;
      return [x + step * (apart + 1) * Math.cos(turn), y + step * (apart + 1) * Math.sin(turn)];
    }),
  );
  return [[x, y], ...around];
}

const inset = ({ x, y, width, height }: Box): Box => ({
  x: x + apart / 2,
  y: y + apart / 2,
  width: width - apart,
  height: height - apart,
});

function kept([x, y]: Place, plot: Box): Place {
  return [
    Math.min(Math.max(x, plot.x), plot.x + plot.width),
    Math.min(Math.max(y, plot.y), plot.y + plot.height),
  ];
}

export function markerMarks({ series, at, true: place, away }: Marker, look: Look): Mark[] {
  const { colours } = look;
  const hue = hueOf(series, look);
  const hollow = series.outlined || away;
  const radius = series.emphasised ? markerRadius + 1 : markerRadius;
  const moved = !away && distance(at, place) > 1;
  return [
    ...(moved
      ? [
          { kind: 'line', from: place, to: at, stroke: hue, width: 1.5 } as const,
          { kind: 'disc', at: place, radius: 4, fill: hue, stroke: colours.card, width: 1.5 } as const,
        ]
      : []),
    {
      kind: 'disc',
      at,
      radius: radius + 1,
      fill: colours.card,
      stroke: colours.card,
      width: 2,
    },
    { kind: 'disc', at, radius, fill: hollow ? colours.card : hue, stroke: hue, width: hollow ? 2 : 0 },
    {
      kind: 'text',
      at: [at[0], at[1] + 0.5],
      text: series.letter,
      fill: hollow ? hue : colours.onHue,
      size: 14,
      weight: 900,
      align: 'middle',
    },
  ];
}
