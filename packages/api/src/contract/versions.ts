import { z } from 'zod';

/** The version that a change was made to. */
export const versionSchema = z.number({ error: 'State the version that this changes.' }).int();

export const versionedSchema = z.strictObject({ version: versionSchema });

export type Versioned = z.infer<typeof versionedSchema>;
