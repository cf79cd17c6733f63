import { create } from 'zustand';
import { persist } from 'zustand/middleware';
import { shareAcrossTabs } from '../../../shared/across-tabs';
import type { OptionDraft } from '../families/family-ui';

/** One person's edits of one option that are not stored yet, and what was stored when they began. */
export interface KeptDraft extends OptionDraft {
  base: OptionDraft;
}

/** The size of an option as its plan states it. */
export interface PlanSize {
  units?: number | undefined;
  clusterSize?: number | undefined;
}

/** Sizes that one person is trying out in one study; while it lasts, the hold is Sizes. */
export interface Sizing {
  /** The sizes stated before, by option: what undoing goes back to. */
  before: Record<string, PlanSize>;
}

interface Drafts {
  drafts: Record<string, KeptDraft>;
  sizings: Record<string, Sizing>;
}

/** Unsaved edits on this device, by person and option: a reload and a lost session leave them alone. */
export const useDrafts = create<Drafts>()(
  persist((): Drafts => ({ drafts: {}, sizings: {} }), { name: 'steelyard-option-drafts' }),
);
shareAcrossTabs(useDrafts);

/** Of a person's draft of an option, and of the sizes they try out in a study. */
export const draftKey = (personId: string, id: string): string => `${personId}/${id}`;

export function keepDraft(key: string, draft: KeptDraft): void {
  useDrafts.setState(({ drafts }) => ({ drafts: { ...drafts, [key]: draft } }));
}

export function dropDraft(key: string): void {
  useDrafts.setState(({ drafts: { [key]: _, ...rest } }) => ({ drafts: rest }));
}
