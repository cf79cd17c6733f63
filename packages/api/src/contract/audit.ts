import { z } from 'zod';

export const auditActions = [
  'created',
  'changed',
  'added',
  'duplicated',
  'removed',
  'restored',
  'ruled on',
  'chose',
  'withdrew',
  'invited',
  'welcomed',
] as const;

const factsSchema = z.record(z.string(), z.union([z.string(), z.number(), z.boolean(), z.null()]));

/** One thing somebody did, as in “Ada Merrow changed planning value ICC”, with what it was before and after. */
export const auditEntrySchema = z.object({
  id: z.number().int(),
  at: z.iso.datetime(),
  /** Null where the server did it. */
  by: z.string().nullable(),
  action: z.enum(auditActions),
  what: z.string(),
  /** Every fact that changed, by its path; null where there was nothing before. */
  before: factsSchema.nullable(),
  /** Null where there is nothing after. */
  after: factsSchema.nullable(),
});

/** Newest first; `next` is the `before` of the page that follows, null on the last. */
export const auditSchema = z.object({
  entries: z.array(auditEntrySchema),
  next: z.number().int().nullable(),
});

export const auditPageSchema = z.strictObject({
  before: z.coerce.number().int().positive().optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

export type AuditAction = (typeof auditActions)[number];
export type AuditFacts = z.infer<typeof factsSchema>;
export type AuditEntryView = z.infer<typeof auditEntrySchema>;
export type AuditView = z.infer<typeof auditSchema>;
export type AuditPage = z.infer<typeof auditPageSchema>;
