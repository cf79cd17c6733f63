import type { StudyView } from '@steelyard/api/contract/studies';
import { type FamilyId, families, type Hypothesis, type OutcomeKind } from '@steelyard/calc';
import { list } from '../../../shared/format/lists';
import { cluster } from './cluster';
import { clusterBaseline } from './cluster-baseline';
import { clusterCrossover } from './cluster-crossover';
import { clusterSchedule } from './cluster-schedule';
import { crossover } from './crossover';
import { factorial } from './factorial';
import type { FamilyUi } from './family-ui';
import { multiArm } from './multi-arm';
import { parallel } from './parallel';
import { partiallyNested } from './partially-nested';
import { steppedWedge } from './stepped-wedge';
import { threeLevelCluster } from './three-level-cluster';

/** The face of every family; one without a face does not compile. */
export const familyUis = {
  parallel,
  'multi-arm': multiArm,
  crossover,
  cluster,
  'cluster-baseline': clusterBaseline,
  'cluster-crossover': clusterCrossover,
  'stepped-wedge': steppedWedge,
  'cluster-schedule': clusterSchedule,
  'three-level-cluster': threeLevelCluster,
  'partially-nested': partiallyNested,
  factorial,
} satisfies Record<FamilyId, FamilyUi>;

export const familyUiOf = (family: FamilyId): FamilyUi => familyUis[family];

/** Why a study cannot have a family; undefined where it can. */
export const refusalOf = (family: FamilyId, study: StudyView): string | undefined =>
  familyUis[family].refusal(study) ?? combinationRefusal(family, study);

/** Whether the family is computed for the study's outcome and hypothesis is calc's to say. */
function combinationRefusal(family: FamilyId, { plan: { outcome, test } }: StudyView): string | undefined {
  const combines: Partial<Record<OutcomeKind, readonly Hypothesis[]>> = families[family].combines;
  const hypotheses = combines[outcome.kind];
  if (hypotheses?.includes(test.hypothesis)) return undefined;
  return hypotheses
    ? `For ${outcomeWords[outcome.kind]} it is computed for ${list(hypotheses)} only.`
    : `It is computed for ${list(outcomeKinds.filter((kind) => kind in combines).map((kind) => outcomeWords[kind]))}, not for ${outcomeWords[outcome.kind]}.`;
}

const outcomeWords: Record<OutcomeKind, string> = {
  continuous: 'a mean',
  binary: 'a proportion',
  'time-to-event': 'a time to an event',
  count: 'a rate',
  ordinal: 'ordered categories',
};

const outcomeKinds = Object.keys(outcomeWords) as OutcomeKind[];
