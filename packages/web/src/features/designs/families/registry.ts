import type { FamilyId } from '@steelyard/calc';
import { cluster } from './cluster';
import { crossover } from './crossover';
import type { FamilyUi } from './family-ui';
import { multiArm } from './multi-arm';
import { parallel } from './parallel';

/** The face of every family; one without a face does not compile. */
export const familyUis = {
  parallel,
  'multi-arm': multiArm,
  crossover,
  cluster,
} satisfies Record<FamilyId, FamilyUi>;

export const familyUiOf = (family: FamilyId): FamilyUi => familyUis[family];
