import { create } from 'zustand';
import { persist } from 'zustand/middleware';
import { shareAcrossTabs } from '../../../shared/across-tabs';

/** What a person has typed and not saved, as JSON, and the version and values it began from. */
export interface KeptEdit {
  version: number | null;
  base: string;
  text: string;
}

interface KeptEdits {
  edits: Record<string, KeptEdit>;
}

/** Unsaved edits on this device, by person and what they edit: a reload and a lost session leave them alone. */
export const useKeptEdits = create<KeptEdits>()(
  persist((): KeptEdits => ({ edits: {} }), { name: 'steelyard-edits' }),
);
shareAcrossTabs(useKeptEdits);

export const editKey = (personId: string, what: string): string => `${personId}/${what}`;

export function keepEdit(key: string, edit: KeptEdit): void {
  useKeptEdits.setState(({ edits }) => ({ edits: { ...edits, [key]: edit } }));
}

export function dropEdit(key: string): void {
  if (!(key in useKeptEdits.getState().edits)) return;
  useKeptEdits.setState(({ edits: { [key]: _, ...rest } }) => ({ edits: rest }));
}

/** A form's values as text that is the same whatever order its parts were registered in. */
export const textOfValues = (values: unknown): string =>
  JSON.stringify(values, (_, value: unknown) =>
    typeof value === 'object' && value !== null && !Array.isArray(value)
      ? Object.fromEntries(Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : 1)))
      : value,
  );

/** The values again; what JSON has no word for, such as a field left empty, comes back empty. */
export const valuesOfText = (text: string): unknown =>
  JSON.parse(text, (_, value: unknown) => (value === null ? undefined : value));
