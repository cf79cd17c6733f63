import { z } from 'zod';

const word = z.string().trim().min(1, 'Enter a word.').max(100);

export const nounSchema = z.object({ one: word, many: word });

export const treatmentSchema = z.object({ name: z.string().trim().min(1, 'Name the treatment.').max(200) });

export type Noun = z.infer<typeof nounSchema>;
export type Treatment = z.infer<typeof treatmentSchema>;
