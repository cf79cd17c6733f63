import type { FieldError } from 'react-hook-form';

/** What is wrong with a list as a whole, else with the first of its parts that is wrong. */
export function listMessage(error: FieldError | undefined): string | undefined {
  if (!error) return undefined;
  const parts = Array.isArray(error) ? (error as (FieldError | undefined)[]) : [];
  return (
    error.message ?? error.root?.message ?? parts.map(listMessage).find((message) => message !== undefined)
  );
}
