import { createContext } from 'react';

/** Where what pops up is put: the themed ground or, while a dialog stands over it, the dialog. */
export const MountContext = createContext<HTMLElement | null>(null);
