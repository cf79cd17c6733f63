import { create } from 'zustand';
import { persist } from 'zustand/middleware';

export const themeChoices = ['system', 'light', 'dark'] as const;
export type ThemeChoice = (typeof themeChoices)[number];

interface Preferences {
  theme: ThemeChoice;
  panelFolded: boolean;
}

/** What a person prefers on this device; kept in local storage. */
export const usePreferences = create<Preferences>()(
  persist((): Preferences => ({ theme: 'system', panelFolded: false }), { name: 'steelyard-preferences' }),
);
