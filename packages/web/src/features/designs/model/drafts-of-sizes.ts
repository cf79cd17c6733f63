import type { DesignSetView, OptionView } from '@steelyard/api/contract/design-sets';
import type { Appraisal } from '@steelyard/calc';
import { draftKey, type KeptDraft, type PlanSize, useDrafts } from './drafts';
import { draftOf, sameOption } from './option-draft';

interface SizedOption {
  id: string;
  stored: OptionView;
  draft: KeptDraft | undefined;
  appraisal: Appraisal | null;
}

interface SizedStudy {
  study: { id: string };
  designSet: DesignSetView;
  options: readonly SizedOption[];
}

/** Holds the sizes in the person's drafts: each option is entered at the size it has. */
export function holdSizes(personId: string, set: SizedStudy): void {
  trySizes(personId, set);
}

/** Gives an option another size in the person's draft. The first time, what is held becomes the sizes. */
export function resize(personId: string, set: SizedStudy, optionId: string, size: PlanSize): void {
  trySizes(personId, set, { optionId, size });
}

function trySizes(personId: string, set: SizedStudy, moved?: { optionId: string; size: PlanSize }): void {
  useDrafts.setState(({ drafts, sizings }) => {
    const key = draftKey(personId, set.study.id);
    const current = sizings[key];
    const begun = current && isPending(set) ? current : undefined;
    const before = { ...begun?.before };
    const next = { ...drafts };
    const put = (option: SizedOption, changed: PlanSize) => {
      before[option.id] ??= sizeIn(option.draft ?? option.stored);
      setDraft(next, draftKey(personId, option.id), withSize(option, changed));
    };
    for (const option of set.options) {
      if (option.id === moved?.optionId) put(option, { ...takenSize(option), ...moved.size });
      else if (!begun && set.designSet.hold.kind !== 'sizes') put(option, takenSize(option));
    }
    return { drafts: next, sizings: { ...sizings, [key]: { before } } };
  });
}

/** Puts every size back to what it was before the first was moved, and with it the hold. */
export function undoSizes(personId: string, { study, options }: SizedStudy): void {
  useDrafts.setState(({ drafts, sizings }) => {
    const key = draftKey(personId, study.id);
    const { [key]: sizing, ...others } = sizings;
    const next = { ...drafts };
    for (const option of options) {
      const size = sizing?.before[option.id];
      if (size) setDraft(next, draftKey(personId, option.id), withSize(option, size));
    }
    return { drafts: next, sizings: others };
  });
}

/** The sizes are stored or given up: what is stored as the hold is in force again. */
export function endSizing(personId: string, studyId: string): void {
  useDrafts.setState(({ sizings: { [draftKey(personId, studyId)]: _, ...rest } }) => ({ sizings: rest }));
}

/** After an option was stored: what is left of its draft begins from there. */
export function rebase(personId: string, stored: OptionView): void {
  useDrafts.setState(({ drafts }) => {
    const key = draftKey(personId, stored.id);
    const draft = drafts[key];
    if (!draft) return {};
    const next = { ...drafts };
    setDraft(next, key, { ...draft, base: draftOf(stored) });
    return { drafts: next };
  });
}

/** The options whose size in the person's draft is not the one stored. */
export const resized = <Option extends SizedOption>(options: readonly Option[]): Option[] =>
  options.filter(({ stored, draft }) => draft && !sameSize(sizeIn(draft), sizeIn(stored)));

/** Whether saving the sizes would store anything. */
export const isPending = ({ designSet, options }: SizedStudy): boolean =>
  designSet.hold.kind !== 'sizes' || resized(options).length > 0;

export const sizeIn = ({ plan: { units, clusterSize } }: { plan: PlanSize }): PlanSize => ({
  units,
  clusterSize,
});

const sameSize = (a: PlanSize, b: PlanSize): boolean =>
  a.units === b.units && a.clusterSize === b.clusterSize;

/** The units an option has now, where it can be sized. */
const takenSize = ({ appraisal }: SizedOption): PlanSize =>
  appraisal?.feasible ? { units: appraisal.units } : {};

function withSize({ stored, draft }: SizedOption, size: PlanSize): KeptDraft {
  const from = draft ?? { ...draftOf(stored), base: draftOf(stored) };
  return { ...from, plan: { ...from.plan, ...size } };
}

/** Keeps a draft among the others; one that changes nothing is dropped. */
function setDraft(drafts: Record<string, KeptDraft>, key: string, draft: KeptDraft): void {
  if (sameOption(draft, draft.base)) delete drafts[key];
  else drafts[key] = draft;
}
