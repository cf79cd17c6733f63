import type { Look } from './scene/chart-data';

/** How wide text comes out in a font. `edition` changes when the font has arrived, and with it every width. */
export function textMeasure(font: string, edition: number): Look['measure'] {
  const pen = document.createElement('canvas').getContext('2d');
  const known = new Map<string, number>();
  return (text, size, weight) => {
    const key = `${edition} ${weight} ${size} ${text}`;
    let width = known.get(key);
    if (width === undefined) {
      if (pen) pen.font = `${weight} ${size}px ${font}`;
      width = pen?.measureText(text).width ?? 0.56 * size * text.length;
      known.set(key, width);
    }
    return width;
  };
}
