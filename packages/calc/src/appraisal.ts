/** What a request comes to. Proportions in 0–1, months real. */
export type Appraisal = Feasible | Infeasible;

export interface Infeasible {
  feasible: false;
  infeasible: {
    code: 'clusters' | 'margin' | 'effect';
    message: string;
    limitingPower?: number;
    fewestUnits?: number;
  };
  cautions: Caution[];
}

export interface Feasible {
  feasible: true;
  units: number;
  unroundedUnits?: number;
  clusterSize?: number;
  groups: Group[];
  arms: ArmLoad[];
  participants: number;
  clusters?: number;
  recruited: number;
  recruitedClusters?: number;
  measurements: number;
  power: number;
  detectable?: number;
  standardError: number;
  expectedHalfWidth: number;
  criticalValue: number;
  df: number | null;
  designEffect?: number;
  requiredEvents?: number;
  expectedEvents?: number;
  comparisons: ComparisonResult[];
  disjunctivePower?: number;
  conjunctivePower?: number;
  alphaPerComparison?: number;
  costs?: CostSheet;
  timeline?: Timeline;
  cautions: Caution[];
}

/** An arm or a sequence, as randomised. */
export interface Group {
  label: string;
  units: number;
  clusters?: number;
  participants: number;
  recruited: number;
  recruitedClusters?: number;
}

/** A treatment: how often it is received, and what is measured under it. */
export interface ArmLoad {
  label: string;
  exposures: number;
  measurements: number;
}

export interface ComparisonResult {
  arm: number;
  versus: number;
  effect: number;
  standardError: number;
  power: number;
}

export interface CostSheet {
  total: number;
  perRecruited: number;
  arms: { label: string; direct: number; shared: number; total: number; perExposure: number }[];
  lines: CostLine[];
}

export interface CostLine {
  label: string;
  quantity: number;
  rate: number;
  amount: number;
}

export interface Timeline {
  months: number;
  phases: { label: string; from: number; to: number }[];
}

export type CautionCode =
  | 'few-clusters'
  | 'few-clusters-period'
  | 'normal-reference'
  | 'carryover'
  | 'no-washout'
  | 'high-attrition'
  | 'unequal-sd'
  | 'small-counts'
  | 'multiplicity'
  | 'icc-zero'
  | 'equal-sizes'
  | 'one-per-sequence'
  | 'completers-only'
  | 'small-ancova'
  | 'dilution'
  | 'accrual'
  | 'missing-figure'
  | 'fixed-design'
  | 'random-error'
  | 'confirm';

export interface Caution {
  code: CautionCode;
  message: string;
  source?: string;
}

/** One line of the working: TeX of the formula and of the same with the figures put in. */
export interface Step {
  label: string;
  formula: string;
  substituted: string;
  value: number;
  source: string;
}

export interface CurvePoint {
  size: number;
  power: number;
  detectable?: number;
  /** Of the first comparison's interval. */
  expectedHalfWidth: number;
  participants: number;
  clusters?: number;
  cost?: number;
  months?: number;
}
