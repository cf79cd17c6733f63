export interface Noun {
  one: string;
  many: string;
}

const symbols: Record<string, string> = { EUR: '€', GBP: '£', USD: '$' };
const narrowSpace = '\u202f';

export const noun = ({ one, many }: Noun, n: number): string => (n === 1 ? one : many);

export const count = (n: number): string => Math.round(n).toLocaleString('en-GB');

export const percent = (proportion: number): string =>
  `${Number((100 * proportion).toPrecision(3))}${narrowSpace}%`;

/** Thousands of the currency, as in 19 k€; whole units below ten thousand. */
export function money(amount: number, currency: string): string {
  const sign = symbols[currency] ?? currency;
  const thousands = Math.abs(amount) >= 10_000;
  const figure = count(thousands ? amount / 1000 : amount);
  return thousands ? `${figure}${narrowSpace}k${sign}` : `${figure}${narrowSpace}${sign}`;
}

export function months(n: number): string {
  return `${count(n)} ${Math.round(n) === 1 ? 'month' : 'months'}`;
}

/** Parts joined as in “a, b and c”; empty ones are left out. */
export function list(parts: readonly string[]): string {
  const kept = parts.filter((part) => part !== '');
  return kept.length < 2 ? (kept[0] ?? '') : `${kept.slice(0, -1).join(', ')} and ${kept.at(-1)}`;
}

export function sentences(parts: readonly string[]): string {
  return parts
    .filter((part) => part !== '')
    .map((part) => `${part}.`)
    .join(' ');
}
