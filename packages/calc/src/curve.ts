import { z } from 'zod';
import type { CurvePoint } from './appraisal.js';
import { moneyAndTime, precision } from './appraise.js';
import { type Bound, bind } from './bind.js';
import { CalcError } from './errors.js';
import { type AppraisalRequest, parseRequest } from './parse-request.js';
import { wholeNumber } from './request.js';
import { detectableEffect, solve } from './solve.js';
import { totalsOf } from './totals.js';

export const curveSpecSchema = z
  .strictObject({
    over: z.enum(['units', 'clusterSize']),
    from: wholeNumber('The start of the curve', 1),
    to: wholeNumber('The end of the curve', 1),
    points: wholeNumber('The number of points', 2, 10_000),
  })
  .refine(({ from, to }) => to >= from, {
    path: ['to'],
    message: 'The curve must end at or after its start.',
  });

export type CurveSpec = z.infer<typeof curveSpecSchema>;

/**
 * One option over its size: whole sizes spread evenly from `from` to `to`, each once; sizes too small to
 * analyse are left out. `detectable` is at the aim's power, where the aim has one.
 *
 * Throws CalcError as `appraise` does, and for a curve over the cluster size of a design without clusters.
 */
export function curve(request: AppraisalRequest, spec: CurveSpec): CurvePoint[] {
  const bound = bind(parseRequest(request));
  const checked = curveSpecSchema.safeParse(spec);
  if (!checked.success) {
    const issue = checked.error.issues[0];
    throw new CalcError('schema', `curve.${issue?.path.join('.') ?? ''}`, issue?.message ?? 'Not a curve.');
  }
  if (spec.over === 'units') {
    const lowest = bound.plan.minimumUnits;
    const clusterSize = clusterSizeOf(bound);
    return sizesOf(spec)
      .filter((units) => units >= lowest)
      .map((units) => curvePoint(bound, units, units, clusterSize));
  }
  if (bound.plan.clusterSize === undefined) {
    throw new CalcError(
      'unsupported',
      'curve.over',
      'Only designs that randomise clusters have a cluster size.',
    );
  }
  const units = unitsOf(bound);
  return sizesOf(spec).map((size) => curvePoint(bound, size, units, size));
}

function sizesOf({ from, to, points }: CurveSpec): number[] {
  const step = (to - from) / (points - 1);
  return [...new Set(Array.from({ length: points }, (_, index) => Math.round(from + index * step)))];
}

/** The request's own, or what the aim asks for where that is the cluster size. */
function clusterSizeOf(bound: Bound): number | undefined {
  if (bound.request.aim.find !== 'cluster-size') return bound.plan.clusterSize;
  const solution = solve(bound);
  return 'code' in solution ? bound.plan.clusterSize : solution.clusterSize;
}

function unitsOf(bound: Bound): number {
  if ('units' in bound.request.aim) return bound.request.aim.units;
  const solution = solve(bound);
  return 'code' in solution ? bound.plan.minimumUnits : solution.units;
}

function curvePoint(bound: Bound, size: number, units: number, clusterSize: number | undefined): CurvePoint {
  const { plan, request } = bound;
  const evaluated = bound.evaluate(plan.groupUnits(units), clusterSize);
  const point: CurvePoint = {
    size,
    power: evaluated.power,
    expectedHalfWidth: precision(bound, evaluated).expectedHalfWidth,
    participants: 0,
  };
  if ('power' in request.aim && request.test.hypothesis === 'superiority') {
    const detectable = detectableEffect(bound, units, request.aim.power, clusterSize);
    if (typeof detectable === 'number') point.detectable = detectable;
  }
  const layout = plan.layout(units, clusterSize);
  const totals = totalsOf(layout);
  const { costs, timeline } = moneyAndTime(bound, layout, totals);
  point.participants = totals.participants;
  if (totals.clusters !== undefined) point.clusters = totals.clusters;
  if (costs) point.cost = costs.total;
  if (timeline) point.months = timeline.months;
  return point;
}
