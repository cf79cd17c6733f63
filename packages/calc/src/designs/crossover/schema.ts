import { z } from 'zod';
import { comparisonsSchema, correlation } from '../../request.js';

const sequence = z
  .string()
  .regex(/^[A-J]{2,20}$/, 'Write a sequence as capital letters, one per period, such as AB; A is control.');

const sequences = z
  .array(sequence)
  .min(1, 'Name the sequences, such as AB and BA.')
  .max(20, 'Name 20 sequences or fewer.')
  .superRefine((all, context) => {
    const refuse = (path: number[], message: string) => context.addIssue({ code: 'custom', path, message });
    const [first = ''] = all;
    all.forEach((each, index) => {
      if (each.length !== first.length) {
        refuse(
          [index],
          `All sequences must have as many periods as the first: ${first.length}, not ${each.length}.`,
        );
      }
    });
    const letters = lettersOf(all);
    const missing = letters.findIndex((letter, index) => letter !== 'ABCDEFGHIJ'[index]);
    if (missing >= 0) {
      refuse(
        [],
        `Name the treatments A, B, C… without a gap, A being control: ${'ABCDEFGHIJ'[missing]} is in no sequence.`,
      );
    } else if (letters.length < 2) {
      refuse([], 'A crossover compares two treatments or more: A, the control, and B.');
    }
  });

/** The treatments of these sequences, control first. */
export function lettersOf(all: readonly string[]): string[] {
  return [...new Set(all.join(''))].sort();
}

export const crossoverSchema = z.strictObject({
  family: z.literal('crossover'),
  sequences,
  correlation: correlation('The within-person correlation'),
  carryover: z.boolean().optional(),
  comparisons: comparisonsSchema.optional(),
});

export type CrossoverDesign = z.infer<typeof crossoverSchema>;
