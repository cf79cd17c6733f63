import { z } from 'zod';

/** Largest number of units, participants per cluster or any other count that a request may name. */
export const largestCount = 1e9;
const largestQuantity = 1e12;
const smallestSpread = 1e-12;

/** A finite number with a message for people; `lowest` and `highest` are inclusive. */
export const quantity = (name: string, lowest = -largestQuantity, highest = largestQuantity) =>
  z
    .number({ error: `${name} must be a number.` })
    .min(lowest, `${name} must be ${lowest} or more.`)
    .max(highest, `${name} must be ${highest} or less.`);

export const positive = (name: string) =>
  z
    .number({ error: `${name} must be a number.` })
    .min(smallestSpread, `${name} must be above 0.`)
    .max(largestQuantity, `${name} must be ${largestQuantity} or less.`);

export const openProportion = (name: string) =>
  z
    .number({ error: `${name} must be a number.` })
    .gt(0, `${name} must lie between 0 and 1, both excluded.`)
    .lt(1, `${name} must lie between 0 and 1, both excluded.`);

export const closedProportion = (name: string) =>
  z
    .number({ error: `${name} must be a number.` })
    .min(0, `${name} must lie between 0 and 1.`)
    .max(1, `${name} must lie between 0 and 1.`);

/** A share lost or diluted away: everything cannot be lost. */
const lostShare = (name: string) =>
  z
    .number({ error: `${name} must be a number.` })
    .min(0, `${name} must be 0 or more.`)
    .lt(1, `${name} must be below 1: nothing would be left to analyse.`);

export const correlation = (name: string) =>
  z
    .number({ error: `${name} must be a number.` })
    .gt(-1, `${name} must lie between −1 and 1, both excluded.`)
    .lt(1, `${name} must lie between −1 and 1, both excluded.`);

export const wholeNumber = (name: string, lowest: number, highest = largestCount) =>
  z
    .number({ error: `${name} must be a whole number.` })
    .int(`${name} must be a whole number.`)
    .min(lowest, `${name} must be ${lowest} or more.`)
    .max(highest, `${name} must be ${highest} or less.`);

/** Relative group sizes, control first; no group more than 1000 times another. */
export const allocation = z
  .array(positive('An allocation share'))
  .refine((shares) => Math.max(...shares) <= 1000 * Math.min(...shares), {
    message: 'No group may be more than 1000 times as large as another.',
  });

/** Probabilities of ordered categories: all of them together are certain, and no single one is. */
export const categoryProbabilities = z
  .array(closedProportion('A category probability'))
  .min(2, 'State two categories or more.')
  .max(100, 'State at most 100 categories.')
  .refine((probabilities) => Math.abs(probabilities.reduce((sum, p) => sum + p, 0) - 1) <= 1e-9, {
    message: 'The category probabilities must add up to 1.',
  })
  .refine((probabilities) => probabilities.filter((p) => p > 0).length > 1, {
    message: 'One category has everyone: at least two must be possible.',
  });

const better = z.enum(['higher', 'lower']).optional();

const repeatedSchema = z.strictObject({
  baselines: wholeNumber('The number of baselines', 0, 1000),
  followUps: wholeNumber('The number of follow-ups', 1, 1000),
  correlation: correlation('The correlation between measurements'),
});

export const outcomeSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('continuous'),
    difference: quantity('The target difference'),
    sd: positive('The standard deviation'),
    sdActive: positive('The standard deviation in the active arm').optional(),
    repeated: repeatedSchema.optional(),
    better,
  }),
  z.strictObject({
    kind: z.literal('binary'),
    control: openProportion('The control proportion'),
    active: openProportion('The active proportion'),
    method: z.enum(['pooled', 'unpooled', 'continuity-corrected', 'arcsine']).optional(),
    better,
  }),
  z
    .strictObject({
      kind: z.literal('time-to-event'),
      hazardRatio: positive('The hazard ratio'),
      controlSurvival: z.strictObject({
        at: positive('The month at which survival is stated'),
        probability: openProportion('The control survival'),
      }),
      accrual: quantity('The accrual period', 0),
      followUp: quantity('The follow-up', 0),
      dropoutHazard: quantity('The dropout hazard', 0).optional(),
      method: z.enum(['schoenfeld', 'freedman']).optional(),
      better,
    })
    .refine(({ accrual, followUp }) => accrual + followUp >= smallestSpread, {
      path: ['followUp'],
      message: 'Nobody is followed up: accrual or follow-up must be above 0.',
    }),
  z.strictObject({
    kind: z.literal('count'),
    controlRate: positive('The control rate'),
    rateRatio: positive('The rate ratio'),
    exposure: positive('The exposure'),
    dispersion: quantity('The dispersion', 0).optional(),
    better,
  }),
  z.strictObject({
    kind: z.literal('ordinal'),
    controlProbabilities: categoryProbabilities,
    oddsRatio: positive('The odds ratio'),
    better,
  }),
]);

export const testSchema = z.strictObject({
  hypothesis: z.enum(['superiority', 'non-inferiority', 'equivalence']),
  alpha: z
    .number({ error: 'The type I error must be a number.' })
    .min(1e-9, 'The type I error must be 0.000000001 or more.')
    .max(0.5, 'The type I error must be 0.5 or less.'),
  sides: z.union([z.literal(1), z.literal(2)], { error: 'A test has one side or two.' }),
  margin: positive('The margin').optional(),
  reference: z.enum(['t', 'normal']).optional(),
});

export const comparisonsSchema = z.strictObject({
  against: z.enum(['control', 'all-pairs']),
  adjust: z.enum(['none', 'bonferroni', 'holm', 'dunnett', 'fixed-sequence']),
  powerGoal: z.enum(['per-comparison', 'disjunctive', 'conjunctive']),
  effects: z.array(quantity('An effect')).optional(),
});

const power = openProportion('The power');
const units = wholeNumber('The number of units', 1);

export const aimSchema = z.discriminatedUnion('find', [
  z.strictObject({ find: z.literal('size'), power }),
  z.strictObject({ find: z.literal('power'), units }),
  z.strictObject({ find: z.literal('effect'), units, power }),
  z.strictObject({ find: z.literal('cluster-size'), units, power }),
]);

export const attritionSchema = z.strictObject({
  participants: lostShare('Attrition').optional(),
  units: lostShare('The loss of whole clusters').optional(),
});

export const dilutionSchema = z.strictObject({
  contamination: lostShare('Contamination').optional(),
  nonAdherence: lostShare('Non-adherence').optional(),
});

const money = (name: string) => quantity(name, 0);

export const costPlanSchema = z.strictObject({
  currency: z.string().min(1, 'Name the currency.').max(10),
  fixed: money('The fixed cost').optional(),
  perArm: money('The cost per arm').optional(),
  perCluster: money('The cost per cluster').optional(),
  perRecruited: money('The cost per recruited participant').optional(),
  perMeasurement: money('The cost per measurement').optional(),
  perExposure: z.array(money('The cost per exposure')).optional(),
  perClusterPeriod: z.array(money('The cost per cluster-period')).optional(),
  perMonth: money('The cost per month').optional(),
  overhead: quantity('The overhead', 0, 100).optional(),
});

const months = (name: string) => quantity(name, 0, 1200);

export const timelinePlanSchema = z
  .strictObject({
    startUp: months('Start-up').optional(),
    accrualPerMonth: positive('Accrual per month').optional(),
    accrualPerClusterPerMonth: positive('Accrual per cluster per month').optional(),
    followUp: months('Follow-up').optional(),
    period: months('A period').optional(),
    washout: months('Washout').optional(),
    closeOut: months('Close-out').optional(),
  })
  .refine((plan) => plan.accrualPerMonth === undefined || plan.accrualPerClusterPerMonth === undefined, {
    path: ['accrualPerClusterPerMonth'],
    message: 'State accrual for the whole study or per cluster, not both.',
  });

/** Every part of a request but the design, whose schema each family brings. */
export const requestParts = {
  outcome: outcomeSchema,
  test: testSchema,
  aim: aimSchema,
  attrition: attritionSchema.optional(),
  dilution: dilutionSchema.optional(),
  costs: costPlanSchema.optional(),
  timeline: timelinePlanSchema.optional(),
};

export type Outcome = z.infer<typeof outcomeSchema>;
export type OutcomeKind = Outcome['kind'];
export type ContinuousOutcome = Extract<Outcome, { kind: 'continuous' }>;
export type BinaryOutcome = Extract<Outcome, { kind: 'binary' }>;
export type TimeToEventOutcome = Extract<Outcome, { kind: 'time-to-event' }>;
export type CountOutcome = Extract<Outcome, { kind: 'count' }>;
export type OrdinalOutcome = Extract<Outcome, { kind: 'ordinal' }>;
export type TestPlan = z.infer<typeof testSchema>;
export type Hypothesis = TestPlan['hypothesis'];
export type Comparisons = z.infer<typeof comparisonsSchema>;
export type Aim = z.infer<typeof aimSchema>;
export type Attrition = z.infer<typeof attritionSchema>;
export type Dilution = z.infer<typeof dilutionSchema>;
export type CostPlan = z.infer<typeof costPlanSchema>;
export type TimelinePlan = z.infer<typeof timelinePlanSchema>;

/** One question of one design: what `appraise`, `explain` and `curve` answer. */
export interface RequestFor<D> {
  outcome: Outcome;
  test: TestPlan;
  design: D;
  aim: Aim;
  attrition?: Attrition | undefined;
  dilution?: Dilution | undefined;
  costs?: CostPlan | undefined;
  timeline?: TimelinePlan | undefined;
}
