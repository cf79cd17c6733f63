import type { FieldPath, FieldValues, UseFormSetError } from 'react-hook-form';
import { timeOfDay } from '../format/times';
import { ApiError } from './client';

/** Puts a refusal's issues at the fields they concern; what is left is a message for the whole form. */
export function placeFaults<Values extends FieldValues>(
  error: unknown,
  fields: readonly FieldPath<Values>[],
  setError: UseFormSetError<Values>,
): string | undefined {
  if (!(error instanceof ApiError)) throw error;
  const { issues = [] } = error.problem;
  const rest = issues.filter(({ path, message }) => {
    const field = fields.find((name) => name === path);
    if (field) setError(field, { message }, { shouldFocus: true });
    return !field;
  });
  if (rest.length > 0) return rest.map(({ message }) => message).join(' ');
  return issues.length > 0 ? undefined : messageOf(error);
}

/** What to tell of a refusal as a whole, with when to try again where that is what it asks. */
export function messageOf(error: unknown): string {
  if (!(error instanceof ApiError)) return 'Something unexpected happened in this page.';
  const { code, retryAfterSeconds } = error.problem;
  return code === 'too-many-attempts'
    ? `Too many attempts. ${retryAdvice(retryAfterSeconds)}`
    : error.message;
}

function retryAdvice(seconds: number | undefined): string {
  if (seconds === undefined) return 'Wait a while, then try again.';
  return `Try again in ${span(seconds)}, from ${timeOfDay(Date.now() + 1000 * seconds)} on.`;
}

function span(seconds: number): string {
  if (seconds < 90) return `${Math.ceil(seconds)} ${Math.ceil(seconds) === 1 ? 'second' : 'seconds'}`;
  return `${Math.ceil(seconds / 60)} minutes`;
}
