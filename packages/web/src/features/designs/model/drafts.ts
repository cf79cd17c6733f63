import { create } from 'zustand';
import { persist } from 'zustand/middleware';
import type { OptionDraft } from '../families/family-ui';

/** One person's edits of one option that are not stored yet, and what was stored when they began. */
export interface KeptDraft extends OptionDraft {
  base: OptionDraft;
}

interface Drafts {
  drafts: Record<string, KeptDraft>;
}

/** Unsaved edits on this device, by person and option: a reload and a lost session leave them alone. */
export const useDrafts = create<Drafts>()(
  persist((): Drafts => ({ drafts: {} }), { name: 'steelyard-option-drafts' }),
);

export const draftKey = (personId: string, optionId: string): string => `${personId}/${optionId}`;

export function keepDraft(key: string, draft: KeptDraft): void {
  useDrafts.setState(({ drafts }) => ({ drafts: { ...drafts, [key]: draft } }));
}

export function dropDraft(key: string): void {
  useDrafts.setState(({ drafts: { [key]: _, ...rest } }) => ({ drafts: rest }));
}
