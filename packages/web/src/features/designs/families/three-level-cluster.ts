import { capitalised } from '../../../shared/format/lists';
import { count } from '../../../shared/format/numbers';
import { allocated, armShares, equalShares, inEachArm, treatedByArm, twoArms } from './arms';
import { clustersUnnamed } from './cluster';
import type { FamilyUi } from './family-ui';
import { numberAt } from './structure';

/** Whole clusters in two arms; within each, subclusters hold the participants. */
export const threeLevelCluster: FamilyUi = {
  name: 'Three-level cluster',
  describes:
    'Whole groups are randomised whose members stand in groups of their own, as pupils do in classes.',
  suits: { randomises: 'clusters', staged: false },
  refusal: clustersUnnamed,
  start: () => ({
    treatments: [0, 1],
    structure: { ...equalShares(2), subclustersPerCluster: 4, subclusterSize: 10 },
    overrides: {},
  }),
  arms: twoArms,
  whole: allocated,
  treated: treatedByArm,
  summary({ structure }, size, { clusters, participants }) {
    const within = `${shown(structure.subclustersPerCluster)} subclusters × ${shown(structure.subclusterSize)}`;
    return size?.clusters === undefined
      ? `${within} ${participants.many} in each ${clusters.one}`
      : `${count(size.clusters)} ${clusters.many} × ${within}`;
  },
  sizeNoun: (plan, { clusters }) => inEachArm(clusters.many, plan),
  schematic: ({ structure }, { arms, clusters, participants }) => ({
    periods: ['After'],
    sequences: arms.map((name, arm) => ({
      name,
      note: `${shown(structure.subclustersPerCluster)} subclusters of ${shown(structure.subclusterSize)} ${participants.many} in each ${clusters.one}`,
      cells: [arm],
      nested: 'subclusters',
    })),
  }),
  structure: (_, __, words) => [
    {
      part: 'told',
      says: 'A subcluster is a group within the cluster, such as a class within a school. The ledger holds an ICC for each level.',
    },
    {
      part: 'whole',
      key: 'subclustersPerCluster',
      label: `Subclusters in each ${words.clusters.one}`,
    },
    {
      part: 'whole',
      key: 'subclusterSize',
      label: `${capitalised(words.participants.many)} in each subcluster`,
    },
    armShares(words),
  ],
};

const shown = (value: unknown): string => count(numberAt(value, 1));
