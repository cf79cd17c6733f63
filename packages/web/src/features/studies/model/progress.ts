import type { DesignSetView } from '@steelyard/api/contract/design-sets';
import type { CostPlanView, LedgerView, StudyView } from '@steelyard/api/contract/studies';
import { type AppraisalRequest, appraise, CalcError, requestOf } from '@steelyard/calc';
import { counted } from '../../../shared/format/lists';
import { toReplace } from './assumed';

/** How far a page of a study has got, and what it still waits for. */
export interface Progress {
  mark: 'done' | 'part' | 'empty';
  says: string;
}

interface Parts {
  study: StudyView;
  ledger: LedgerView['values'];
  costs: CostPlanView;
  designSet: DesignSetView;
}

export const progressOf = (parts: Parts) => ({
  question: questionProgress(parts),
  ledger: ledgerProgress(parts),
  costs: costsProgress(parts),
  weigh: weighProgress(parts),
});

function questionProgress({ study: { basis, estimand } }: Parts): Progress {
  if (!basis) return part('the basis of the target difference is not stated');
  if (!estimand) return part('the estimand is not stated');
  const { intercurrentEvents, ...attributes } = estimand;
  const unsaid = [...Object.values(attributes), ...intercurrentEvents.map(({ event }) => event)];
  const open = unsaid.filter((text) => text === '').length + (intercurrentEvents.length === 0 ? 1 : 0);
  return open === 0 ? done('question and estimand are stated') : part('the estimand has open attributes');
}

function ledgerProgress({ ledger }: Parts): Progress {
  if (ledger.length === 0) return empty('no planning value is stated');
  const assumed = ledger.filter(({ source }) => source === toReplace).length;
  return assumed === 0
    ? done('every value stated has a source')
    : part(`${counted(assumed, 'value is', 'values are')} “${toReplace}”`);
}

function costsProgress(parts: Parts): Progress {
  const { costs, timeline, source } = parts.costs;
  const { currency: _, ...figures } = costs;
  if (Object.keys(figures).length + Object.keys(timeline).length === 0) return empty('no figure is stated');
  if (source === null) return part('nobody has said where the figures come from');
  if (source === toReplace) return part(`the figures are “${toReplace}”`);
  return wantsFigure(parts)
    ? part('an option lacks a figure')
    : done('every figure the options need is stated');
}

/** Whether the calculation leaves something out of an option's money or months for want of a figure. */
function wantsFigure({ study, ledger, costs, designSet }: Parts): boolean {
  return designSet.options.some(({ plan }) => {
    const request = requestOf({ question: study.plan, ledger, costs, hold: designSet.hold }, plan);
    const sized = { ...request, aim: { find: 'power', units: plan.units ?? 20 } };
    try {
      return appraise(sized as AppraisalRequest).cautions.some(({ code }) => code === 'missing-figure');
    } catch (error) {
      // What cannot be computed at all is told on Weigh.
      if (error instanceof CalcError) return false;
      throw error;
    }
  });
}

function weighProgress({ designSet: { options, choice } }: Parts): Progress {
  if (options.length === 0) return empty('no option yet');
  return choice ? done('the choice is recorded') : part('no choice is recorded');
}

const done = (what: string): Progress => ({ mark: 'done', says: `Done: ${what}` });
const part = (what: string): Progress => ({ mark: 'part', says: `In part: ${what}` });
const empty = (what: string): Progress => ({ mark: 'empty', says: `To do: ${what}` });
