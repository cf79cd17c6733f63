import { type Frame, textSize } from './axes';
import type { ChartData, Look } from './chart-data';
import { type Curve, type End, hueOf } from './curves';
import { contains } from './geometry';
import { placeLabels, type Wanted } from './labels';
import { type Marker, markerRadius } from './markers';
import type { Box, Mark, Place } from './marks';
import { ruleLabels, ruleLine } from './rules';

/** Names of curves, rules and limits, each where it lies on nothing else. */
export function labelMarks(
  data: ChartData,
  frame: Frame,
  look: Look,
  curves: readonly Curve[],
  markers: readonly Marker[],
  ends: readonly End[],
): Mark[] {
  const { colours, measure } = look;
  const { plot } = frame;
  const fills = new Map<string, string>();
  const wide = plot.width > 460;
  const rules = ruleLabels(data, frame, look);
  const names = curves.flatMap(({ series, places }): Wanted[] => {
    const text = wide ? `${series.letter} ${shortened(series.name, 30)}` : series.letter;
    if (!wide && series.now) return [];
    fills.set(`name ${series.id}`, hueOf(series, look));
    const width = measure(text, textSize, 700);
    const letter = { text: series.letter, width: measure(series.letter, textSize, 700) };
    return [
      {
        key: `name ${series.id}`,
        text,
        width,
        height: textSize + 3,
        candidates: besides(places.filter((place) => contains(plot, place))),
        ...(wide && !series.now ? { shorter: letter } : {}),
      },
    ];
  });
  const limits = ends.map(({ series, label, at: [x, y] }): Wanted => {
    fills.set(`end ${series.id}`, colours.muted);
    const places = [-14, 14, -26, 26].flatMap((step) => [
      { at: [x + 6, y + step] as Place, align: 'start' as const },
      { at: [x - 6, y + step] as Place, align: 'end' as const },
    ]);
    const key = `end ${series.id}`;
    return {
      key,
      text: label,
      width: measure(label, textSize, 400),
      height: textSize + 3,
      candidates: places,
    };
  });
  const placed = placeLabels([...rules, ...names, ...limits], {
    bounds: plot,
    boxes: [...markers.map(({ at }) => around(at)), ...markers.map((marker) => around(marker.true, 5))],
    paths: [...curves.map(({ places }) => places), ...data.rules.map((rule) => ruleLine(rule, frame))],
  });
  return placed.map(({ key, text, at, align }): Mark => {
    const weight = key.startsWith('name') ? 700 : 400;
    const fill = fills.get(key) ?? colours.text;
    return { kind: 'text', at, text, fill, size: textSize, weight, align, halo: colours.card };
  });
}

/** Places for a curve's name: above and below it, from its far end backwards. */
function besides(places: readonly Place[]): Wanted['candidates'] {
  const steps = Array.from({ length: 12 }, (_, step) => Math.round(((places.length - 1) * (12 - step)) / 12));
  return [...new Set(steps)].flatMap((index) => {
    const place = places[index];
    if (!place) return [];
    const [x, y] = place;
    return [
      { at: [x, y - 15] as const, align: 'end' as const },
      { at: [x, y + 16] as const, align: 'end' as const },
      { at: [x + 12, y + 16] as const, align: 'start' as const },
      { at: [x - 12, y - 15] as const, align: 'end' as const },
      { at: [x + 12, y] as const, align: 'start' as const },
      { at: [x - 12, y] as const, align: 'end' as const },
    ];
  });
}

const around = ([x, y]: Place, reach = markerRadius + 3): Box => ({
  x: x - reach,
  y: y - reach,
  width: 2 * reach,
  height: 2 * reach,
});

const shortened = (name: string, most: number): string =>
  name.length > most ? `${name.slice(0, most - 1).trimEnd()}…` : name;
