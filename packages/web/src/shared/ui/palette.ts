import { createContext, useContext } from 'react';

/** The product's colours in one kind of surroundings. */
export interface Palette {
  ground: string;
  card: string;
  line: string;
  edge: string;
  text: string;
  muted: string;
  bar: string;
  brass: string;
  brassSoft: string;
  fits: string;
  over: string;
  options: readonly [string, string, string, string, string, string];
  /** Text on brass and on an option's hue. */
  onHue: string;
  /** A row under the pointer, and the chosen one. */
  hovered: string;
  chosen: string;
}

/** The theme's colours as values, for pictures: a canvas cannot read the variables that components use. */
export const PaletteContext = createContext<Palette | null>(null);

export function usePalette(): Palette {
  const palette = useContext(PaletteContext);
  if (!palette) throw new Error('Pictures are drawn inside the theme.');
  return palette;
}
