import { z } from 'zod';

export const problemCodes = [
  'unreadable',
  'signed-out',
  'forbidden',
  'not-found',
  'stale',
  'invalid',
  'too-many-attempts',
  'internal',
] as const;

/** `application/problem+json` (RFC 9457); `issues` name the field each message concerns. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  code: z.enum(problemCodes),
  detail: z.string().optional(),
  issues: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
  /** With `stale`: what is there now, as its own route answers; null where there is nothing any more. */
  current: z.unknown().optional(),
  correlationId: z.string().optional(),
  retryAfterSeconds: z.number().int().optional(),
});

export type Problem = z.infer<typeof problemSchema>;
export type ProblemCode = Problem['code'];
