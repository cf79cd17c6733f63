import type { Verdict, WeighedOption } from '@steelyard/calc';
import { roundedReals } from '../common/significant-digits.js';
import type { WeighedOptionView, WeighView } from '../contract/design-sets.js';

export const weighView = (verdict: Verdict, weighed: WeighedOption[]): WeighView => ({
  verdict,
  options: weighed.map(weighedOptionView),
});

const weighedOptionView = ({
  id,
  letter,
  name,
  request,
  appraisal,
  error,
  standing,
  ruling,
}: WeighedOption): WeighedOptionView => ({
  optionId: id,
  letter,
  name,
  request: { ...request },
  appraisal: appraisal && { ...roundedReals(appraisal) },
  error,
  standing: standing && { ...roundedReals(standing) },
  ruling,
});
