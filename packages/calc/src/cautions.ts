import type { Caution } from './appraisal.js';
import type { AppraisalRequest } from './parse-request.js';

/** Cautions that do not depend on the family. */
export function generalCautions(
  { attrition, design, dilution, test }: AppraisalRequest,
  active: number,
  missing: readonly string[],
): Caution[] {
  const cautions: Caution[] = [];
  const compared = 'comparisons' in design ? design.comparisons : undefined;
  const count = compared?.against === 'all-pairs' ? (active * (active + 1)) / 2 : active;
  if (compared?.adjust === 'none' && count > 1) {
    cautions.push({
      code: 'multiplicity',
      message: `${count} comparisons, each tested at ${percent(test.alpha)} without adjustment: say why no adjustment is called for, or choose one.`,
      source: 'CONSORT extension for multi-arm trials, 2019',
    });
  }
  const kept = (1 - (attrition?.participants ?? 0)) * (1 - (attrition?.units ?? 0));
  if (kept < 0.8 - 1e-12) {
    cautions.push({
      code: 'high-attrition',
      message:
        'More than 20 % are expected to be lost. Recruiting more makes up for the number, never for the bias of who is lost.',
      source: 'Schulz & Grimes 2002',
    });
  }
  const diluted = (dilution?.contamination ?? 0) > 0 || (dilution?.nonAdherence ?? 0) > 0;
  if (diluted && test.hypothesis !== 'superiority') {
    cautions.push({
      code: 'dilution',
      message: `Contamination and non-adherence make arms look alike, which flatters ${test.hypothesis}: plan without dilution, and analyse those who adhered as well.`,
      source: 'CONSORT extension for non-inferiority and equivalence trials, 2012',
    });
  }
  if (missing.length > 0) {
    cautions.push({
      code: 'missing-figure',
      message: `Left out for want of a figure: ${missing.join(', ')}. Months and cost are too low by as much.`,
    });
  }
  return [...cautions, ...standingCautions];
}

const percent = (proportion: number) => `${Number((100 * proportion).toPrecision(4))} %`;

const standingCautions: readonly Caution[] = [
  {
    code: 'fixed-design',
    message: 'A fixed design: no interim look at the data is allowed for.',
  },
  {
    code: 'random-error',
    message: 'The size deals with random error only; it mends no bias.',
  },
  {
    code: 'confirm',
    message:
      'A planning aid: have a qualified statistician confirm design, assumptions and numbers, and follow the ethics committee and local rules.',
  },
];
