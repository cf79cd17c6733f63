import { thin } from './spaces';

const locale = 'en-GB';
const wholeNumbers = new Intl.NumberFormat(locale, { maximumFractionDigits: 0 });
const formatters = new Map<string, Intl.NumberFormat>();

/** Formatters take long to make, and a picture in motion asks for hundreds. */
function formatter(options: Intl.NumberFormatOptions): Intl.NumberFormat {
  const key = JSON.stringify(options);
  const known = formatters.get(key) ?? new Intl.NumberFormat(locale, options);
  formatters.set(key, known);
  return known;
}

/** 1760 as “1,760”. */
export const count = (value: number): string => wholeNumbers.format(value);

/** 0.9 as “90 %”; up to `decimals` places, none that are 0. */
export const percent = (proportion: number, decimals = 1): string =>
  `${formatter({ maximumFractionDigits: decimals }).format(100 * proportion)}${thin}%`;

/** A power as the tables show it, always to one place: “90.1 %”; never rounded up to certainty. */
export const power = (value: number): string => {
  const shown = value < 1 && value > 0.9995 ? 0.999 : value;
  return `${(100 * shown).toFixed(1)}${thin}%`;
};

/** A real figure to `digits` significant digits, as “2.1” or “0.306316”. */
export const figure = (value: number, digits = 6): string =>
  formatter({ maximumSignificantDigits: digits }).format(value).replace('-', '−');

/** Months to one place: “40.9”. */
export const months = (value: number): string => formatter({ maximumFractionDigits: 1 }).format(value);

/** A number and its unit held together: “13 g/L”. */
export const withUnit = (number: string, unit: string): string => (unit ? `${number}${thin}${unit}` : number);
