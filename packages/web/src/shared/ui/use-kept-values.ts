import { useEffect } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';

/** What was typed under this key in this tab and not sent yet. */
export function keptValues<Values>(key: string): Values | undefined {
  const kept = sessionStorage.getItem(key);
  return kept === null ? undefined : (JSON.parse(kept) as Values);
}

export const dropValues = (key: string): void => sessionStorage.removeItem(key);

/** Keeps what is typed into a form through a reload and a lost session, until it is dropped. */
export function useKeptValues<Values extends FieldValues>({ watch }: UseFormReturn<Values>, key: string) {
  useEffect(() => {
    const { unsubscribe } = watch((values) => sessionStorage.setItem(key, JSON.stringify(values)));
    return unsubscribe;
  }, [watch, key]);
}
