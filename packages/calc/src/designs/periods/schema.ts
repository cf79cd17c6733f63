import { z } from 'zod';
import { allocation, closedProportion, quantity, wholeNumber } from '../../request.js';

/** Sequences or periods beyond this are no trial, and would take their time to compute. */
export const mostPeriods = 60;

const required = (name: string, why: string) => (issue: { input?: unknown }) =>
  issue.input === undefined ? `State the ${name}: ${why}` : `The ${name} must be a number.`;

/** A proportion without which a design over periods cannot be planned. */
const stated = (name: string, why: string) =>
  z
    .number({ error: required(name, why) })
    .min(0, `The ${name} must lie between 0 and 1.`)
    .max(1, `The ${name} must lie between 0 and 1.`);

/** What every design over cluster periods says of its clusters. */
export const periodFields = {
  icc: stated('ICC', 'the correlation of two participants of one cluster in one period.'),
  cac: stated(
    'cluster autocorrelation',
    'the correlation between periods over that within one. Planning at 1 unasked would flatter the design.',
  ),
  decay: z.boolean().optional(),
  iac: closedProportion('The individual autocorrelation')
    .max(0.999999, 'The individual autocorrelation must be 0.999999 or less.')
    .optional(),
  clusterSize: wholeNumber('The cluster size', 1),
  clusterSizeCv: quantity('The CV of cluster size', 0, 100).optional(),
  allocation: allocation.min(1).max(mostPeriods).optional(),
};

const periodSchema = z.strictObject(periodFields);

/** The part of a design that its correlations and clusters are in, whatever its schedule. */
export type PeriodsDesign = z.infer<typeof periodSchema>;
