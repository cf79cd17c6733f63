import { z } from 'zod';
import { mostPeriods, periodFields } from '../periods/schema.js';

const cell = z.union([z.literal(0), z.literal(1), z.null()], {
  error: 'Write 0 for control, 1 for active and null where a cluster is not measured.',
});

const row = z
  .array(cell)
  .min(1, 'A sequence needs a period.')
  .max(mostPeriods, `A sequence may have ${mostPeriods} periods at most.`);

/** A row per sequence: all as long as the first, and each measured at some time. */
const schedule = z
  .array(row)
  .min(1, 'A schedule needs a sequence.')
  .max(mostPeriods, `A schedule may have ${mostPeriods} sequences at most.`)
  .superRefine((rows, context) => {
    rows.forEach((cells, sequence) => {
      const refuse = (message: string) => context.addIssue({ code: 'custom', path: [sequence], message });
      if (cells.length !== rows[0]?.length) {
        refuse(
          `Every sequence must have as many periods as the first: ${rows[0]?.length}, not ${cells.length}. Write null where a cluster is not measured.`,
        );
      } else if (cells.every((each) => each === null)) {
        refuse('This sequence is never measured: leave it out, or measure it in some period.');
      }
    });
  });

export const clusterScheduleSchema = z.strictObject({
  family: z.literal('cluster-schedule'),
  schedule,
  ...periodFields,
});

export type ClusterScheduleDesign = z.infer<typeof clusterScheduleSchema>;
