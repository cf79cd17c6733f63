import type { z } from 'zod';
import { cluster } from './cluster/family.js';
import { clusterBaseline } from './cluster-baseline/family.js';
import { clusterCrossover } from './cluster-crossover/family.js';
import { clusterSchedule } from './cluster-schedule/family.js';
import { crossover } from './crossover/family.js';
import { factorial } from './factorial/family.js';
import type { Family } from './family.js';
import { multiArm } from './multi-arm/family.js';
import { parallel } from './parallel/family.js';
import { partiallyNested } from './partially-nested/family.js';
import { steppedWedge } from './stepped-wedge/family.js';
import { threeLevelCluster } from './three-level-cluster/family.js';

/** The one list of design families. */
export const families = {
  parallel,
  'multi-arm': multiArm,
  crossover,
  cluster,
  'cluster-baseline': clusterBaseline,
  'cluster-crossover': clusterCrossover,
  'stepped-wedge': steppedWedge,
  'cluster-schedule': clusterSchedule,
  factorial,
  'partially-nested': partiallyNested,
  'three-level-cluster': threeLevelCluster,
};

export type FamilyId = keyof typeof families;
export type Design = z.infer<(typeof families)[FamilyId]['schema']>;

export const familyIds = Object.keys(families) as [FamilyId, ...FamilyId[]];

export function familyOf(id: FamilyId): Family<Design> {
  return families[id] as Family<Design>;
}
