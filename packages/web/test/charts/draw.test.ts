import { describe, expect, it } from 'vitest';
import { drawScene, type Pen } from '../../src/charts/draw/draw-scene';
import { writeSvg } from '../../src/charts/draw/write-svg';
import { wholeView } from '../../src/charts/scene/chart-data';
import { curveScene } from '../../src/charts/scene/curve-scene';
import type { Mark, Scene } from '../../src/charts/scene/marks';
import { look, picture, size } from './picture';

const sceneOf = (...marks: Mark[]): Scene => ({
  width: 100,
  height: 50,
  background: '#ffffff',
  font: 'Lato',
  plot: { x: 0, y: 0, width: 100, height: 50 },
  marks,
  handles: [],
  curves: [],
});

/** A context that writes down what is asked of it, with the colours in force where something is put down. */
function recording() {
  const log: string[] = [];
  const state: Record<string, unknown> = {};
  const pen = new Proxy(state, {
    get: (_, name: string) =>
      name in state
        ? state[name]
        : (...args: unknown[]) => {
            const ink = { fill: state.fillStyle, fillRect: state.fillStyle, fillText: state.fillStyle }[name];
            const line = { stroke: state.strokeStyle, strokeText: state.strokeStyle }[name];
            const numbers = args.map((arg) =>
              typeof arg === 'number' ? Math.round(arg) : JSON.stringify(arg),
            );
            log.push([name, ...numbers, ink ?? line ?? ''].join(' ').trim());
          },
    set: (_, name: string, value) => {
      state[name] = value;
      return true;
    },
  });
  return { pen: pen as unknown as Pen, log };
}

const drawn = (...marks: Mark[]) => {
  const { pen, log } = recording();
  drawScene(pen, sceneOf(...marks));
  return log;
};

describe('Drawing on a canvas', () => {
  it('begins with the ground', () => {
    expect(drawn()).toEqual(['fillRect 0 0 100 50 #ffffff']);
  });

  it('draws a broken path in its colour', () => {
    const points = [
      [1, 2],
      [3, 4],
      [5, 6],
    ] as const;
    expect(drawn({ kind: 'path', points, stroke: '#123456', width: 2, dash: [4, 2] }).slice(1)).toEqual([
      'beginPath',
      'moveTo 1 2',
      'lineTo 3 4',
      'lineTo 5 6',
      'setLineDash [4,2]',
      'stroke #123456',
    ]);
  });

  it('bends a smooth path through its points', () => {
    const points = [
      [0, 0],
      [10, 10],
      [20, 0],
      [30, 10],
    ] as const;
    const log = drawn({ kind: 'path', points, smooth: true, stroke: '#123456', width: 2 });
    expect(log).toContain('moveTo 0 0');
    expect(
      log.filter((line) => line.startsWith('bezierCurveTo')).map((line) => line.split(' ').slice(-2)),
    ).toEqual([
      ['10', '10'],
      ['20', '0'],
      ['30', '10'],
    ]);
  });

  it('puts text down over its halo', () => {
    const text = { kind: 'text', at: [5, 6], text: 'hold', fill: '#111111', size: 13, weight: 700 } as const;
    expect(drawn({ ...text, align: 'middle', halo: '#eeeeee' }).slice(1)).toEqual([
      'setLineDash []',
      'strokeText "hold" 5 6 #eeeeee',
      'fillText "hold" 5 6 #111111',
    ]);
  });

  it('shows of clipped marks what lies within, and takes the clip back', () => {
    const box = { x: 1, y: 2, width: 3, height: 4 };
    const inner: Mark = { kind: 'box', box, fill: '#abcdef' };
    expect(drawn({ kind: 'clip', box, marks: [inner] }).slice(1)).toEqual([
      'save',
      'beginPath',
      'rect 1 2 3 4',
      'clip',
      'fillRect 1 2 3 4 #abcdef',
      'restore',
    ]);
  });

  it('leaves out a box without extent', () => {
    const box = { x: 1, y: 2, width: 0, height: 4 };
    expect(drawn({ kind: 'box', box, fill: '#abcdef', hatch: '#000000' })).toHaveLength(1);
  });

  it('restores the context as often as it saves it', () => {
    const { pen, log } = recording();
    drawScene(pen, curveScene(picture(), size, look, wholeView));
    const times = (name: string) => log.filter((line) => line === name).length;
    expect(times('save')).toBeGreaterThan(0);
    expect(times('restore')).toBe(times('save'));
    expect(log.join('\n')).not.toContain('NaN');
  });
});

describe('Writing an SVG', () => {
  const svg = (scene: Scene) =>
    new DOMParser().parseFromString(
      writeSvg(scene, { title: 'Power < cost & "more"', description: 'B costs least.' }),
      'image/svg+xml',
    );

  it('says what it shows, whatever signs are in it', () => {
    const file = svg(sceneOf());
    expect(file.querySelector('parsererror')).toBeNull();
    expect(file.querySelector('title')?.textContent).toBe('Power < cost & "more"');
    expect(file.querySelector('desc')?.textContent).toBe('B costs least.');
    expect(file.documentElement.getAttribute('viewBox')).toBe('0 0 100 50');
  });

  it('has every mark of the picture', () => {
    const scene = curveScene(picture(), size, look, wholeView);
    const file = svg(scene);
    expect(file.querySelector('parsererror')).toBeNull();
    expect(file.querySelectorAll('circle')).toHaveLength(4);
    const words = [...file.querySelectorAll('text')].map(({ textContent }) => textContent);
    expect(words).toEqual(expect.arrayContaining(['A', 'B', 'Power', 'hold: 80 %', '≤ 20 clusters']));
    expect(file.documentElement.outerHTML).not.toContain('NaN');
  });
});
