import { z } from 'zod';

/** What a request comes to, as @steelyard/calc's `Appraisal` lists it field by field. */
export const appraisalSchema = z.looseObject({ feasible: z.boolean() });

export type AppraisalView = z.infer<typeof appraisalSchema>;
