import type { Ruling } from '@steelyard/calc';

export const rulingWords: Record<Ruling['kind'], string> = {
  admissible: 'Admissible',
  conditions: 'Admissible, with conditions',
  'not-admissible': 'Not admissible',
};
