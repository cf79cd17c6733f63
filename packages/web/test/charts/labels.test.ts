import { describe, expect, it } from 'vitest';
import { type ChartData, wholeView } from '../../src/charts/scene/chart-data';
import { curveScene } from '../../src/charts/scene/curve-scene';
import { evened, overlap, runsThrough } from '../../src/charts/scene/geometry';
import { boxOf, placeLabels } from '../../src/charts/scene/labels';
import type { Mark, TextMark } from '../../src/charts/scene/marks';
import { look, picture } from './picture';

const bounds = { x: 0, y: 0, width: 200, height: 100 };
const label = (key: string, ...at: [number, number][]) => ({
  key,
  text: key,
  width: 40,
  height: 16,
  candidates: at.map((place) => ({ at: place, align: 'start' as const })),
});

describe('Labels', () => {
  it('take the first place that is free, and none where all are taken', () => {
    const placed = placeLabels([label('a', [10, 20]), label('b', [20, 20], [10, 60]), label('c', [12, 58])], {
      bounds,
      boxes: [],
      paths: [],
    });
    expect(placed.map(({ key, at }) => [key, ...at])).toEqual([
      ['a', 10, 20],
      ['b', 10, 60],
    ]);
  });

  it('keep within the picture, and off curves and markers', () => {
    const placed = placeLabels([label('a', [180, 20], [10, 20], [10, 50], [100, 80])], {
      bounds,
      boxes: [{ x: 0, y: 10, width: 20, height: 20 }],
      paths: [
        [
          [0, 45],
          [200, 55],
        ],
      ],
    });
    expect(placed.map(({ at }) => at)).toEqual([[100, 80]]);
  });

  it('fall back on the shorter name where the longer has no room', () => {
    const [placed] = placeLabels([{ ...label('long', [170, 20]), shorter: { text: 'L', width: 8 } }], {
      bounds,
      boxes: [],
      paths: [],
    });
    expect(placed?.text).toBe('L');
  });

  it('never lie on each other or on a marker, whatever the curves', () => {
    const random = seeded(7);
    for (let round = 0; round < 60; round += 1) {
      const width = 260 + Math.round(1200 * random());
      const scene = curveScene(anyPicture(random), { width, height: 300 }, look, wholeView);
      const labels = scene.marks.filter((mark: Mark): mark is TextMark => 'halo' in mark);
      const boxes = labels.map(({ at, align, text }) => boxOf(at, align, 7 * text.length, 14));
      const markers = scene.handles.map(({ at: [x, y] }) => ({
        x: x - 12,
        y: y - 12,
        width: 24,
        height: 24,
      }));
      for (const [index, box] of boxes.entries()) {
        for (const other of [...boxes.slice(0, index), ...markers]) {
          expect(overlap(box, other), `${labels[index]?.text} in round ${round}`).toBe(false);
        }
      }
    }
  });
});

describe('A path', () => {
  it('runs through a box that it crosses between two of its points', () => {
    const box = { x: 40, y: 40, width: 20, height: 20 };
    expect(
      runsThrough(
        [
          [0, 0],
          [100, 100],
        ],
        box,
      ),
    ).toBe(true);
    expect(
      runsThrough(
        [
          [0, 30],
          [100, 30],
        ],
        box,
      ),
    ).toBe(false);
    expect(
      runsThrough(
        [
          [0, 70],
          [70, 0],
        ],
        box,
      ),
    ).toBe(false);
  });

  it('keeps its ends when it is evened, and itself where its places are far apart', () => {
    const points = Array.from({ length: 96 }, (_, x) => [x, 0] as const);
    const kept = evened(points, 22);
    expect(kept[0]).toEqual([0, 0]);
    expect(kept.at(-1)).toEqual([95, 0]);
    expect(kept.map(([x]) => x)).toEqual([0, 11.5, 33.5, 55.5, 77.5, 91.5, 95]);
    const apart = [
      [0, 0],
      [30, 1],
      [60, 5],
    ] as const;
    expect(evened(apart, 22)).toEqual(apart);
  });
});

/** Up to six options anywhere, some alike to the last pixel. */
function anyPicture(random: () => number): ChartData {
  const data = picture();
  const alike = random() < 0.3;
  const [steepness, start] = [random(), random()];
  return {
    ...data,
    series: Array.from({ length: 1 + Math.floor(6 * random()) }, (_, position) => {
      const [rise, from] = alike ? [steepness, start] : [random(), random()];
      const points = Array.from({ length: 30 }, (_, step) => ({
        size: step + 1,
        x: 60 * from + 1.3 * step,
        y: Math.min(1, 0.2 + rise * (step / 30)),
      }));
      return {
        id: String(position),
        letter: 'ABCDEF'[position] as string,
        name: 'An option with a name as long as its authors like it to be',
        position,
        outlined: false,
        emphasised: position === 0,
        points,
        now: points[Math.floor(30 * random())] ?? null,
        end: random() < 0.5 ? { size: 12, label: '≤ 32 catchments' } : null,
      };
    }),
  };
}

/** A linear congruential generator, so that every run sees the same pictures. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (1_664_525 * state + 1_013_904_223) % 2 ** 32;
    return state / 2 ** 32;
  };
}
