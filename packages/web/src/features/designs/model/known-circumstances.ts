import { create } from 'zustand';
import { persist } from 'zustand/middleware';
import type { Circumstances } from './circumstances';

interface Known {
  studies: Record<string, Circumstances>;
}

/** What a person has said of their studies’ questions, on this device: asked once, not each time. */
export const useKnownCircumstances = create<Known>()(
  persist((): Known => ({ studies: {} }), { name: 'steelyard-circumstances' }),
);

export function keepCircumstances(studyId: string, known: Circumstances): void {
  useKnownCircumstances.setState(({ studies }) => ({ studies: { ...studies, [studyId]: known } }));
}
