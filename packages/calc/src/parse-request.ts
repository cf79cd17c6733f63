import { z } from 'zod';
import { type Design, type FamilyId, families, familyOf } from './designs/registry.js';
import { CalcError } from './errors.js';
import { type RequestFor, requestParts } from './request.js';

export type AppraisalRequest = RequestFor<Design>;

/** The whole request as one schema, for forms and API descriptions; `parseRequest` gives the better messages. */
export const appraisalRequestSchema = z.strictObject({
  ...requestParts,
  design: z.union(Object.values(families).map((family) => family.schema) as z.ZodType<Design>[]),
});

const partsSchema = z.strictObject({ ...requestParts, design: z.looseObject({ family: z.string() }) });

/** Checks a request of unknown shape. Throws CalcError `schema` naming the first field at fault. */
export function parseRequest(input: unknown): AppraisalRequest {
  const parts = parseWith(partsSchema, input, []);
  const { family } = parts.design;
  if (!Object.hasOwn(families, family)) {
    throw new CalcError(
      'unsupported',
      'design.family',
      `The design family “${family}” is not computed; known are ${Object.keys(families).join(', ')}.`,
    );
  }
  const design = parseWith(familyOf(family as FamilyId).schema, parts.design, ['design']);
  return { ...parts, design };
}

function parseWith<T>(schema: z.ZodType<T>, input: unknown, prefix: string[]): T {
  const quick = schema.safeParse(input);
  if (quick.success) return quick.data;
  // Messages cost four times the parsing, so they are made only for requests at fault.
  const result = schema.safeParse(input, { error: plainMessage });
  if (result.success) return result.data;
  const issue = deepestIssue(result.error.issues[0] as z.core.$ZodIssue);
  const field = issue.code === 'unrecognized_keys' ? [...issue.path, issue.keys[0] ?? ''] : issue.path;
  const path = [...prefix, ...field].map(String).join('.');
  throw new CalcError('schema', path, issue.message);
}

function deepestIssue(issue: z.core.$ZodIssue): z.core.$ZodIssue {
  const inner = issue.code === 'invalid_union' ? issue.errors[0]?.[0] : undefined;
  return inner ? deepestIssue({ ...inner, path: [...issue.path, ...inner.path] }) : issue;
}

/** What a field without words of its own says when it is wrong. */
function plainMessage(issue: z.core.$ZodRawIssue): string {
  if (issue.input === undefined) return 'This is missing.';
  switch (issue.code) {
    case 'unrecognized_keys':
      return `There is no field “${issue.keys[0]}” here; check its spelling.`;
    case 'invalid_value':
      return `This must be one of ${issue.values.map(String).join(', ')}.`;
    case 'invalid_type':
      return `This must be ${issue.expected === 'array' ? 'a list' : `a value of type ${issue.expected}`}.`;
    case 'too_big':
      return `This must be at most ${issue.maximum} long.`;
    default:
      return 'This is none of the forms it can take; check its kind.';
  }
}
