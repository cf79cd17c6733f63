/** A rectangle in pixels. */
export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export type Place = readonly [x: number, y: number];

interface Stroke {
  stroke: string;
  width: number;
  dash?: readonly number[];
}

export interface BoxMark {
  kind: 'box';
  box: Box;
  fill: string;
  /** The colour of slanting lines over the fill. */
  hatch?: string;
}

export interface LineMark extends Stroke {
  kind: 'line';
  from: Place;
  to: Place;
}

export interface PathMark extends Stroke {
  kind: 'path';
  points: readonly Place[];
  /** A curve through its points rather than straight stretches. */
  smooth?: boolean;
}

export interface DiscMark {
  kind: 'disc';
  at: Place;
  radius: number;
  fill: string;
  stroke: string;
  width: number;
}

export type Align = 'start' | 'middle' | 'end';

/** Text on one line, centred on its height. */
export interface TextMark {
  kind: 'text';
  at: Place;
  text: string;
  fill: string;
  size: number;
  weight: 400 | 700 | 900;
  align: Align;
  /** The colour of an edge that keeps the text apart from what it lies on. */
  halo?: string;
}

/** Marks of which only what lies within the box is seen. */
export interface ClipMark {
  kind: 'clip';
  box: Box;
  marks: readonly Mark[];
}

export type Mark = BoxMark | LineMark | PathMark | DiscMark | TextMark | ClipMark;

/** Where a pointer may find each size of an option. */
export interface HitCurve {
  id: string;
  sizes: readonly number[];
  places: readonly Place[];
}

/** Where a marker can be taken hold of. */
export interface Handle {
  id: string;
  at: Place;
  /** Its true place: markers that would lie on each other are moved apart. */
  true: Place;
}

/** A whole picture as plain JSON, in pixels, in the order in which it is drawn. */
export interface Scene {
  width: number;
  height: number;
  background: string;
  font: string;
  plot: Box;
  marks: readonly Mark[];
  handles: readonly Handle[];
  curves: readonly HitCurve[];
}
