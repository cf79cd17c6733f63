import { z } from 'zod';
import type { Feasible } from '../appraisal.js';
import { recruitedFor } from '../designs/allocation.js';
import type { AppraisalRequest } from '../parse-request.js';
import { quantity, wholeNumber } from '../request.js';

export const limitKeys = ['clusters', 'participantsPerCluster', 'money', 'months'] as const;
export type LimitKey = (typeof limitKeys)[number];

/** The most clusters, participants per cluster (and period), money and months that exist. */
export const limitsSchema = z.strictObject({
  clusters: wholeNumber('The number of clusters', 1).optional(),
  participantsPerCluster: wholeNumber('The participants per cluster', 1).optional(),
  money: quantity('The money', 0).optional(),
  months: quantity('The months', 0, 1200).optional(),
});
export type Limits = z.infer<typeof limitsSchema>;

/** What an option takes of one limit: `over` is above 0 where it breaks it, below where it has some to spare. */
export interface Use {
  limit: LimitKey;
  allowed: number;
  taken: number;
  over: number;
}

/** What an option takes of each limit that concerns it. */
export type Load = Partial<Record<LimitKey, number | undefined>>;

/** Every limit that concerns the option, in the order in which a breach binds. */
export function usesOf(limits: Limits, load: Load): Use[] {
  return limitKeys.flatMap((limit) => {
    const [allowed, taken] = [limits[limit], load[limit]];
    return allowed === undefined || taken === undefined
      ? []
      : [{ limit, allowed, taken, over: taken - allowed }];
  });
}

/** What an appraised option takes. */
export function loadOf({ attrition }: AppraisalRequest, appraisal: Feasible): Load {
  const { clusterSize } = appraisal;
  return {
    clusters: appraisal.recruitedClusters,
    participantsPerCluster: clusterSize && recruitedFor(clusterSize, attrition?.participants),
    money: appraisal.costs?.total,
    months: appraisal.timeline?.months,
  };
}

/** Money and months are real: a breach smaller than rounding is none. */
export const breaks = ({ over, allowed }: Use): boolean => over > 1e-9 * Math.max(1, allowed);
