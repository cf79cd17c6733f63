import type { Caution } from '../../appraisal.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import type { RequestFor } from '../../request.js';
import type { Layout } from '../family.js';
import { pairedProportions } from './binary.js';
import { type CrossoverDesign, lettersOf } from './schema.js';

/** What a crossover should be warned of at this size. */
export function crossoverCautions(
  { design, attrition, timeline }: RequestFor<CrossoverDesign>,
  layout: Layout,
  [outcome]: readonly OutcomeModel[],
): Caution[] {
  const cautions: Caution[] = [];
  if (!design.carryover) {
    cautions.push({
      code: 'carryover',
      message:
        'No carryover from one period into the next is assumed. In AB/BA a carryover of a share of the effect biases the estimate by half that share; testing for it first does not help.',
      source: 'Senn 2002',
    });
  }
  if (!timeline?.washout) {
    cautions.push({
      code: 'no-washout',
      message:
        'No washout between the periods is planned. State one, and what it rests on, or why none is needed.',
      source: 'Jones & Kenward 2014',
    });
  }
  if (attrition?.participants) {
    cautions.push({
      code: 'completers-only',
      message:
        'Only participants who complete every period are analysed; those lost on the way are replaced in the number recruited, and add nothing.',
      source: 'Senn 2002',
    });
  }
  const comparisons = lettersOf(design.sequences).length - 1;
  if (comparisons > 1 && !design.comparisons) {
    cautions.push({
      code: 'multiplicity',
      message: `${comparisons} treatments are each tested against A without adjustment: say why none is called for, or choose one.`,
      source: 'CONSORT extension for multi-arm trials, 2019',
    });
  }
  return [...cautions, ...discordanceCautions(design, layout, outcome)];
}

/** Only participants whose two answers differ tell of the effect. */
function discordanceCautions(
  { correlation }: CrossoverDesign,
  { groups }: Layout,
  outcome: OutcomeModel | undefined,
): Caution[] {
  if (!outcome?.proportions) return [];
  const participants = groups.reduce((sum, group) => sum + group.participants, 0);
  const { discordance } = pairedProportions(...outcome.proportions, correlation);
  const eachWay = (participants * discordance) / 2;
  if (eachWay >= 5) return [];
  return [
    {
      code: 'small-counts',
      message: `Without an effect only ${eachWay.toFixed(1)} participants would be expected to do better on each treatment than on the other; the normal approximation wants 5 or more. Check this size with an exact method.`,
      source: 'Connor 1987',
    },
  ];
}
