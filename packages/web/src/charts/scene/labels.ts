import { overlap, runsThrough, within } from './geometry';
import type { Align, Box, Place } from './marks';

/** A text that wants a place: the first of its candidates that is free, or none. */
export interface Wanted {
  key: string;
  text: string;
  width: number;
  height: number;
  candidates: readonly { at: Place; align: Align }[];
  /** The name it goes by where there is no room for it. */
  shorter?: { text: string; width: number };
}

export interface Placed {
  key: string;
  text: string;
  at: Place;
  align: Align;
  box: Box;
}

/** What labels keep clear of: boxes that are taken and paths that run there. */
export interface Taken {
  bounds: Box;
  boxes: readonly Box[];
  paths: readonly (readonly Place[])[];
}

/** Gives each text a place where it lies on nothing else, in the order of the list; one without such a place is left out. */
export function placeLabels(wanted: readonly Wanted[], { bounds, boxes, paths }: Taken): Placed[] {
  const occupied = [...boxes];
  return wanted.flatMap(({ key, text, width, height, candidates, shorter }) => {
    const texts = shorter ? [{ text, width }, shorter] : [{ text, width }];
    for (const form of texts) {
      for (const { at, align } of candidates) {
        const box = boxOf(at, align, form.width, height);
        if (!within(box, bounds)) continue;
        if (occupied.some((other) => overlap(box, other))) continue;
        if (paths.some((path) => runsThrough(path, box))) continue;
        occupied.push(box);
        return [{ key, text: form.text, at, align, box }];
      }
    }
    return [];
  });
}

export function boxOf([x, y]: Place, align: Align, width: number, height: number): Box {
  const left = { start: x, middle: x - width / 2, end: x - width }[align];
  return { x: left, y: y - height / 2, width, height };
}
