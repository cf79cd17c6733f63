import { describe, expect, it } from 'vitest';
import { lightPalette } from '../../src/app/theme/palette';
import { type ChartData, type View, wholeView } from '../../src/charts/scene/chart-data';
import { curveScene } from '../../src/charts/scene/curve-scene';
import { sizeNear } from '../../src/charts/scene/hit-test';
import type { Mark, PathMark, Place, TextMark } from '../../src/charts/scene/marks';
import { look, picture, size } from './picture';

const draw = (data: ChartData = picture(), view: View = wholeView, within = size) =>
  curveScene(data, within, look, view);

const flat = (marks: readonly Mark[]): Mark[] =>
  marks.flatMap((mark) => (mark.kind === 'clip' ? flat(mark.marks) : [mark]));
const texts = (marks: readonly Mark[]) =>
  flat(marks).filter((mark): mark is TextMark => mark.kind === 'text');
const paths = (marks: readonly Mark[]) =>
  flat(marks).filter((mark): mark is PathMark => mark.kind === 'path');

/** The plot begins 45 pixels from the left and is 583 wide; from top to bottom it goes from 26 to 276. */
const placed = (cost: number, power: number): Place => [
  expect.closeTo(45 + 5.83 * cost, 6),
  expect.closeTo(276 - 250 * power, 6),
];

describe('The scene of curves', () => {
  it('is plain JSON', () => {
    const scene = draw();
    expect(JSON.parse(JSON.stringify(scene))).toEqual(scene);
  });

  it('leaves room for the ticks and says what each axis counts', () => {
    const { plot, marks } = draw();
    // The widest tick, “100 %”, takes 35 pixels, and 10 keep it from the plot.
    expect(plot).toEqual({ x: 45, y: 26, width: 583, height: 250 });
    const titles = texts(marks).filter(({ text }) => text === 'Power' || text === 'Cost');
    expect(titles).toEqual([
      expect.objectContaining({ text: 'Power', at: [2, 11], weight: 700 }),
      expect.objectContaining({ text: 'Cost', align: 'end', weight: 700 }),
    ]);
    expect(texts(marks).map(({ text }) => text)).toEqual(
      expect.arrayContaining(['0 %', '50 %', '100 %'].filter((label) => label !== '50 %')),
    );
  });

  it('shades the side of each rule that cannot be had', () => {
    const boxes = flat(draw().marks).filter(({ kind }) => kind === 'box');
    const [left, hold] = placed(0, 0.8);
    expect(boxes).toEqual([
      expect.objectContaining({ box: { x: left, y: hold, width: 583, height: expect.closeTo(200, 6) } }),
      expect.objectContaining({
        box: { x: expect.closeTo(45 + 5.83 * 80, 6), y: 26, width: expect.closeTo(116.6, 6), height: 250 },
        hatch: expect.any(String),
      }),
    ]);
  });

  it('draws the front first, then each option with hue and dash, thin beyond its limits', () => {
    const [front, ...curves] = paths(draw().marks);
    const [blue, brown] = lightPalette.options;
    expect(front).toMatchObject({
      points: [placed(20, 0.4), placed(40, 0.7), placed(60, 0.9)],
      width: 11,
    });
    expect(curves).toEqual([
      expect.objectContaining({ stroke: blue, width: 3.25, points: front?.points }),
      expect.objectContaining({ stroke: brown, width: 1.1, points: [placed(70, 0.5), placed(90, 0.6)] }),
      expect.objectContaining({ stroke: brown, width: 2.25, points: [placed(50, 0.2), placed(70, 0.5)] }),
    ]);
    expect(curves[0]).not.toHaveProperty('dash');
    expect(curves[2]).toHaveProperty('dash', [11, 5]);
  });

  it('marks each option’s size with its letter, hollow where it is ruled out', () => {
    const discs = flat(draw().marks).filter(({ kind }) => kind === 'disc');
    const [blue, brown] = lightPalette.options;
    expect(discs).toContainEqual(expect.objectContaining({ at: placed(50, 0.8), fill: blue }));
    expect(discs).toContainEqual(
      expect.objectContaining({ at: placed(70, 0.5), fill: lightPalette.card, stroke: brown }),
    );
  });

  it('names curves, rules and the limit that ends a curve', () => {
    expect(texts(draw().marks).map(({ text }) => text)).toEqual(
      expect.arrayContaining(['A Parallel', 'B Crossover', 'hold: 80 %', 'over 80 k€', '≤ 20 clusters']),
    );
  });

  it('moves markers apart that would lie on each other, with a line to their true place', () => {
    const data = picture();
    const [first] = data.series;
    const same = ['A', 'B', 'C', 'D', 'E', 'F'].map((letter, position) => {
      return { ...first, id: letter, letter, position, emphasised: false } as ChartData['series'][number];
    });
    const { handles, marks } = draw({ ...data, series: same });
    expect(handles).toHaveLength(6);
    for (const [index, { at, true: place }] of handles.entries()) {
      expect(place).toEqual(placed(50, 0.8));
      for (const other of handles.slice(0, index)) {
        expect(Math.hypot(at[0] - other.at[0], at[1] - other.at[1])).toBeGreaterThanOrEqual(24);
      }
    }
    const leads = flat(marks).filter(
      (mark) => mark.kind === 'line' && mark.width === 1.5 && !('dash' in mark),
    );
    // The hold's line is as wide, and one marker keeps its place.
    expect(leads).toHaveLength(5 + 1);
  });

  it('shows a part, larger, where it is zoomed', () => {
    // Twice as large, with the plot’s middle kept in the middle.
    const view = { k: 2, x: -583 / 2, y: -125 };
    const { curves, handles, plot } = draw(picture(), view);
    const [middleX, middleY] = [45 + 583 / 2, 26 + 125];
    const [x, y] = [45 + 5.83 * 40, 276 - 250 * 0.7];
    expect(curves[0]?.places[1]).toEqual([
      expect.closeTo(middleX + 2 * (x - middleX), 6),
      expect.closeTo(middleY + 2 * (y - middleY), 6),
    ]);
    // A marker out of sight waits at the edge.
    expect(handles[0]?.at[1]).toBe(plot.y + 13);
  });

  it('finds the size at which a curve comes nearest to a pointer', () => {
    const scene = draw();
    const at = (cost: number, power: number): Place => [45 + 5.83 * cost, 276 - 250 * power];
    expect(sizeNear(scene, 'a', at(40, 0.7))).toBe(20);
    expect(sizeNear(scene, 'a', at(50, 0.8))).toBe(25);
    expect(sizeNear(scene, 'a', at(0, 0))).toBe(10);
    expect(sizeNear(scene, 'a', at(100, 1))).toBe(30);
    expect(sizeNear(scene, 'none', at(0, 0))).toBeUndefined();
  });

  it('has text of 13 pixels or more at every size, and none outside', () => {
    for (const width of [260, 340, 640, 1500]) {
      for (const mark of texts(draw(picture(), wholeView, { width, height: 280 }).marks)) {
        expect(mark.size).toBeGreaterThanOrEqual(13);
        const length = 7 * mark.text.length;
        const left = mark.at[0] - { start: 0, middle: length / 2, end: length }[mark.align];
        expect(left, `${mark.text} at ${width}`).toBeGreaterThanOrEqual(0);
        expect(left + length, `${mark.text} at ${width}`).toBeLessThanOrEqual(width);
      }
    }
  });
});
