import type { z } from 'zod';
import { cluster } from './cluster/family.js';
import { crossover } from './crossover/family.js';
import type { Family } from './family.js';
import { multiArm } from './multi-arm/family.js';
import { parallel } from './parallel/family.js';

/** The one list of design families. */
export const families = {
  parallel,
  'multi-arm': multiArm,
  crossover,
  cluster,
};

export type FamilyId = keyof typeof families;
export type Design = z.infer<(typeof families)[FamilyId]['schema']>;

export const familyIds = Object.keys(families) as [FamilyId, ...FamilyId[]];

export function familyOf(id: FamilyId): Family<Design> {
  return families[id] as Family<Design>;
}
