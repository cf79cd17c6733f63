import type { Caution } from '../appraisal.js';

/** What the evidence comes in: how many in all and in the smaller arm, and how alike their members are. */
interface Grouping {
  fewest: number;
  total: number;
  icc: number;
  reference?: 't' | 'normal' | undefined;
}

/** Cautions of designs whose participants come in clusters, or are treated in groups. */
export function groupedCautions(
  { one, many }: { one: string; many: string },
  { fewest, total, icc, reference }: Grouping,
): Caution[] {
  const cautions: Caution[] = [];
  if (fewest < 4) {
    cautions.push({
      code: 'few-clusters',
      message: `Fewer than 4 ${many} in an arm: chance imbalance is large, and the degrees of freedom rest on very few of them.`,
      source: 'Hayes & Moulton 2017',
    });
  }
  if (reference === 'normal' && total < 40) {
    cautions.push({
      code: 'normal-reference',
      message: `With ${total} ${many} the normal reference rejects too often; use the t reference below 40.`,
      source: 'Kahan et al. 2016',
    });
  }
  if (icc === 0) {
    cautions.push({
      code: 'icc-zero',
      message: `An ICC of 0 treats members of one ${one} as strangers; plan with a small positive value unless you can show otherwise.`,
      source: 'Donner, Birkett & Buck 1981',
    });
  }
  return cautions;
}
