/** Colours that Fluent's theme has no name for; the theme gives each a value, components read it from here. */
const names = [
  'bar',
  'brassSoft',
  'fits',
  'over',
  'hovered',
  'chosen',
  'onHue',
  'optionA',
  'optionB',
  'optionC',
  'optionD',
  'optionE',
  'optionF',
] as const;

type Name = (typeof names)[number];
export type OwnTheme = Record<`steelyard-${Name}`, string>;

export const ownTokens = Object.fromEntries(
  names.map((name) => [name, `var(--steelyard-${name})`]),
) as Record<Name, string>;

/** The bar is dark in both themes, and so is what stands on it. */
export const onBar = {
  text: '#ffffff',
  muted: '#d3dbe6',
  edge: '#8ea0ba',
  brass: '#d9b26a',
  raised: '#2b4266',
};

const optionHues = [
  ownTokens.optionA,
  ownTokens.optionB,
  ownTokens.optionC,
  ownTokens.optionD,
  ownTokens.optionE,
  ownTokens.optionF,
];

/** An option's hue by its place in the design set; the seventh starts anew. */
export function optionHue(position: number): string {
  return optionHues[position % optionHues.length] as string;
}
