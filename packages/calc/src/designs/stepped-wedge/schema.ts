import { z } from 'zod';
import { wholeNumber } from '../../request.js';
import { mostPeriods, periodFields } from '../periods/schema.js';

export const steppedWedgeSchema = z
  .strictObject({
    family: z.literal('stepped-wedge'),
    steps: wholeNumber('The number of steps', 1, mostPeriods),
    baselinePeriods: wholeNumber('The number of baseline periods', 0, mostPeriods).optional(),
    transitionPeriods: wholeNumber('The number of transition periods', 0, mostPeriods).optional(),
    ...periodFields,
  })
  .refine(
    ({ steps, baselinePeriods = 1, transitionPeriods = 0 }) =>
      steps + baselinePeriods + transitionPeriods <= mostPeriods,
    { path: ['steps'], message: `A wedge may have ${mostPeriods} periods at most.` },
  );

export type SteppedWedgeDesign = z.infer<typeof steppedWedgeSchema>;
