const labels: Record<string, string> = {
  allocation: 'Allocation',
  sequences: 'Sequences',
  carryover: 'Carryover',
  against: 'Compared with',
  adjust: 'Adjustment',
  powerGoal: 'Power goal',
  effects: 'Targets by arm',
  steps: 'Steps',
  baselinePeriods: 'Periods before the first step',
  transitionPeriods: 'Transition periods',
  schedule: 'Schedule',
  decay: 'Correlation fades with time',
  estimand: 'Estimand',
  groupSize: 'Group size',
  subclusterSize: 'Subcluster size',
  subclustersPerCluster: 'Subclusters in each cluster',
};

/** Each part that a structure has, by what it is called, as one reads it; its shares to so many digits. */
export function structureInWords(
  structure: Record<string, unknown>,
  digits = 4,
): [label: string, words: string][] {
  return Object.entries(structure).flatMap(([key, value]): [string, string][] => {
    if (value === undefined || value === null || value === false) return [];
    if (typeof value === 'object' && !Array.isArray(value)) {
      return structureInWords(value as Record<string, unknown>, digits);
    }
    return [[labels[key] ?? key, (special[key] ?? inWords)(value, digits)]];
  });
}

const codes: Record<string, string> = {
  'all-pairs': 'every pair',
  bonferroni: 'Bonferroni',
  holm: 'Holm',
  dunnett: 'Dunnett',
  'fixed-sequence': 'fixed sequence',
  'per-comparison': 'each comparison',
  disjunctive: 'at least one',
  conjunctive: 'all',
  'main-effect': 'main effects',
};

function inWords(value: unknown): string {
  if (Array.isArray(value)) return value.map(inWords).join(', ');
  if (value === true) return 'yes';
  if (value === undefined || value === null) return 'not stated';
  return codes[String(value)] ?? String(value);
}

const cells = new Map<unknown, string>([
  [0, 'control'],
  [1, 'active'],
  [null, 'not measured'],
]);

/** “1.732 : 1 : 1 : 1” */
const ratioInWords = (shares: unknown, digits: number): string =>
  [shares]
    .flat()
    .map((share) => (typeof share === 'number' ? String(Number(share.toPrecision(digits))) : inWords(share)))
    .join(' : ');

/** “control, active; active, control”: a sequence after the other. */
const scheduleInWords = (schedule: unknown): string =>
  [schedule]
    .flat()
    .map((row) =>
      [row]
        .flat()
        .map((cell) => cells.get(cell) ?? String(cell))
        .join(', '),
    )
    .join('; ');

/** Parts that are read in a way of their own. */
const special: Record<string, (value: unknown, digits: number) => string> = {
  allocation: ratioInWords,
  schedule: scheduleInWords,
};
