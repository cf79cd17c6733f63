import { type AppraisalRequest, appraise, CalcError } from '../src/index.js';

/** The request with one field, given by its path, set to a value. */
export function withField(request: AppraisalRequest, path: string, value: unknown): AppraisalRequest {
  const copy = structuredClone(request) as unknown as Record<string, unknown>;
  const keys = path.split('.');
  const leaf = keys.pop() as string;
  let parent = copy;
  for (const key of keys) {
    parent[key] ??= {};
    parent = parent[key] as Record<string, unknown>;
  }
  parent[leaf] = value;
  return copy as unknown as AppraisalRequest;
}

/** The CalcError that a request is refused with. */
export function errorOf(request: unknown): CalcError {
  try {
    appraise(request as AppraisalRequest);
  } catch (error) {
    if (error instanceof CalcError) return error;
    throw error;
  }
  throw new Error('no error was raised');
}
