/** Well-known sets of sequences, by the number of treatments; A is control. */
export interface SequencePreset {
  name: string;
  sequences: readonly string[];
}

const presets: Record<number, readonly SequencePreset[]> = {
  2: [
    { name: 'Two periods', sequences: ['AB', 'BA'] },
    { name: 'Three periods, the last repeated', sequences: ['ABB', 'BAA'] },
    { name: 'Four periods, each repeated', sequences: ['AABB', 'BBAA'] },
    { name: 'Four periods, and back', sequences: ['ABBA', 'BAAB'] },
    { name: 'Four sequences of four periods', sequences: ['AABB', 'BBAA', 'ABBA', 'BAAB'] },
    { name: 'Two periods, the same twice among them', sequences: ['AA', 'AB', 'BA', 'BB'] },
  ],
  3: [
    { name: 'Williams square', sequences: ['ABC', 'BCA', 'CAB', 'CBA', 'ACB', 'BAC'] },
    { name: 'Latin square', sequences: ['ABC', 'BCA', 'CAB'] },
  ],
  4: [{ name: 'Williams square', sequences: ['ABDC', 'BCAD', 'CDBA', 'DACB'] }],
};

/** The usual sets for so many treatments; beyond four, each treatment once, in turn. */
export const presetsFor = (treatments: number): readonly SequencePreset[] =>
  presets[treatments] ?? [{ name: 'Latin square', sequences: latinSquare(treatments) }];

/** Each treatment once in every sequence and in every period. */
function latinSquare(treatments: number): string[] {
  const letters = lettersOf(treatments);
  return letters.map((_, turn) => [...letters.slice(turn), ...letters.slice(0, turn)].join(''));
}

export const lettersOf = (treatments: number): string[] =>
  Array.from({ length: treatments }, (_, index) => String.fromCharCode(65 + index));

export const armOf = (letter: string): number => letter.charCodeAt(0) - 65;
