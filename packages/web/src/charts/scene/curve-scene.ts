import { axisMarks, frameOf } from './axes';
import type { ChartData, ChartPoint, Look, View } from './chart-data';
import { labelMarks } from './curve-labels';
import { curveMarks, endMark, endOf, frontMark } from './curves';
import { markerMarks, placeMarkers } from './markers';
import type { Place, Scene } from './marks';
import { ruleMarks } from './rules';

/** The curves of several options as a picture: axes, barred sides, front, curves, markers, labels. */
export function curveScene(
  data: ChartData,
  size: { width: number; height: number },
  look: Look,
  view: View,
): Scene {
  const frame = frameOf(data, size, view, look);
  const { plot } = frame;
  const placeOf = ({ x, y }: ChartPoint): Place => [frame.x(x), frame.y(y)];
  const curves = data.series.map((series) => ({ series, places: series.points.map(placeOf) }));
  const markers = placeMarkers(
    // The option in hand first, so that its marker stays on its place.
    data.series
      .toSorted((a, b) => Number(b.emphasised) - Number(a.emphasised))
      .flatMap((series) => (series.now ? [{ series, true: placeOf(series.now) }] : [])),
    plot,
  );
  const front = data.front.map((stretch) => stretch.map(([x, y]): Place => [frame.x(x), frame.y(y)]));
  const ends = curves.flatMap((curve) => endOf(curve));
  return {
    ...size,
    background: look.colours.card,
    font: look.font,
    plot,
    marks: [
      ...axisMarks(data, frame, look),
      {
        kind: 'clip',
        box: plot,
        marks: [
          ...ruleMarks(data, frame, look),
          ...front.map((points) => frontMark(points, look)),
          ...curves.flatMap((curve) => curveMarks(curve, look)),
          ...ends.map(({ at, along }) => endMark(at, along, look)),
        ],
      },
      ...markers.toReversed().flatMap((marker) => markerMarks(marker, look)),
      ...labelMarks(data, frame, look, curves, markers, ends),
    ],
    handles: data.series.flatMap(({ id }) => {
      const marker = markers.find((each) => each.id === id);
      return marker ? [{ id, at: marker.at, true: marker.true }] : [];
    }),
    curves: curves.map(({ series: { id, points }, places }) => {
      return { id, sizes: points.map(({ size }) => size), places };
    }),
  };
}
