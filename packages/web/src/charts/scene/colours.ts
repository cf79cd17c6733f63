/** The colour a share of the way from one to another; both as #rrggbb. */
export function mixed(from: string, to: string, share: number): string {
  const [a, b] = [partsOf(from), partsOf(to)];
  const parts = a.map((part, index) => Math.round(part + share * ((b[index] as number) - part)));
  return `#${parts.map((part) => part.toString(16).padStart(2, '0')).join('')}`;
}

const partsOf = (colour: string): number[] =>
  [1, 3, 5].map((start) => Number.parseInt(colour.slice(start, start + 2), 16));
