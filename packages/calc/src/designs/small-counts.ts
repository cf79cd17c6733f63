import type { Caution } from '../appraisal.js';
import type { OutcomeModel } from '../outcomes/outcome-model.js';
import type { Layout } from './family.js';

const wanted = 5;

/** What an arm expects of the thing that the normal approximation wants at least five of. */
function expectedIn(model: OutcomeModel, arm: 0 | 1): { share: number; of: string } | undefined {
  const { proportions, eventProbabilities, expectedCounts, categories } = model;
  if (proportions) {
    return { share: Math.min(proportions[arm], 1 - proportions[arm]), of: 'of its rarer outcome' };
  }
  if (eventProbabilities) return { share: eventProbabilities[arm], of: 'events' };
  if (expectedCounts) return { share: expectedCounts[arm], of: 'events' };
  if (categories) return { share: 1 - Math.max(...categories[arm]), of: 'outside its commonest category' };
  return undefined;
}

/** The caution that a normal approximation rests on too few events, where it does. */
export function smallCountsCautions(layout: Layout, outcomes: readonly OutcomeModel[]): Caution[] {
  const expected = layout.groups.flatMap(({ participants }, arm) => {
    const model = outcomes[Math.max(0, arm - 1)] as OutcomeModel;
    const each = expectedIn(model, arm === 0 ? 0 : 1);
    return each ? [{ count: participants * each.share, of: each.of }] : [];
  });
  const fewest = expected.sort((a, b) => a.count - b.count)[0];
  if (!fewest || fewest.count >= wanted) return [];
  return [
    {
      code: 'small-counts',
      message: `An arm expects only ${fewest.count.toFixed(1)} ${fewest.of}; the normal approximation wants 5 or more. Check this size with an exact method or by simulation.`,
      source: 'Fleiss, Levin & Paik 2003',
    },
  ];
}
