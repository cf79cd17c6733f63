import type { Problem } from '@steelyard/api/contract/problem';

/** What the server answered instead of what was asked for; status 0 when it could not be reached at all. */
export class ApiError extends Error {
  override readonly name = 'ApiError';

  constructor(
    readonly status: number,
    readonly problem: Partial<Problem> & Pick<Problem, 'title'>,
  ) {
    super(problem.detail ?? problem.title);
  }
}

async function send<T>(method: string, path: string, body?: unknown, signal?: AbortSignal): Promise<T> {
  const response = await fetch(new URL(`/api${path}`, location.origin), {
    method,
    ...(body === undefined
      ? {}
      : { body: JSON.stringify(body), headers: { 'content-type': 'application/json' } }),
    ...(signal ? { signal } : {}),
  }).catch((error: unknown) => {
    if (signal?.aborted) throw error;
    throw new ApiError(0, {
      title: 'The server cannot be reached. Check the connection, then try again.',
    });
  });
  if (!response.ok) throw new ApiError(response.status, await problemIn(response));
  return (response.status === 204 ? undefined : await response.json()) as T;
}

async function problemIn(response: Response): Promise<ApiError['problem']> {
  const told = response.headers.get('content-type')?.includes('application/problem+json');
  if (told) return (await response.json()) as Problem;
  return { title: `The server answered with an error it did not explain (${response.status}).` };
}

export const api = {
  get: <T>(path: string, signal?: AbortSignal) => send<T>('GET', path, undefined, signal),
  post: <T>(path: string, body: unknown) => send<T>('POST', path, body),
  put: <T>(path: string, body: unknown) => send<T>('PUT', path, body),
  delete: <T = void>(path: string, body?: unknown) => send<T>('DELETE', path, body),
};
