import { type SquareMatrix, schurComplement, zeroMatrix } from '../../numeric/linear-algebra.js';
import { limitingInformation } from './limiting-information.js';
import { type Correlations, meanPrecision, type PrecisionAt, precisionOver } from './precision.js';
import { isMeasured, type Schedule } from './schedule.js';

/** One sequence: which of the kept periods it is measured in, and the treatment in each of them. */
interface Sequence {
  periods: readonly number[];
  treatments: readonly number[];
  pattern: number;
}

/** How the information on the treatment effect comes about, for σ = 1. */
export interface Information {
  /** What one cluster of each sequence tells, were the period effects known. */
  perCluster: readonly number[];
  /** What estimating the period effects takes away: 0 where every sequence is measured in every period. */
  takenByPeriods: number;
  total: number;
}

/** The information that clusters of a schedule hold on its treatment effect, at any number and size of them. */
export interface PeriodInformation {
  /** 1/variance of the effect for σ = 1; infinite where its variance has no lower limit but 0. */
  total(clusters: readonly number[], clusterSize: number): number;
  inDetail(clusters: readonly number[], clusterSize: number): Information;
}

/**
 * Generalised least squares of a lasting treatment effect over fixed periods.
 *
 * *Formula*: with W the expected inverse covariance of a cluster's period means and x its treatments less their
 * mean in each period, I = Σk·x′Wx − b′A⁻¹b, A = Σk·W, b = Σk·Wx over the sequences of k clusters each. Taking
 * the mean off x changes nothing, since the period effects are free, but keeps the digits.
 * *Source*: Hussey & Hughes 2007, Contemp Clin Trials 28:182; Li, Hughes, Hemming, Taljaard, Melnick & Heagerty
 * 2021, Stat Methods Med Res 30:612.
 * *Units*: σ = 1; an infinite cluster size gives the limit.
 * *Accuracy*: relative 1e-9 (periods/cases.json, information.test.ts).
 */
export function periodInformation(schedule: Schedule, stated: Correlations): PeriodInformation {
  const correlations = { ...stated, icc: settled(stated.icc), cac: settled(stated.cac) };
  const kept = (schedule[0] ?? []).flatMap((_, period) =>
    schedule.some((row) => isMeasured(row[period] ?? null)) ? [period] : [],
  );
  const patterns = new Map<string, { index: number; precisionAt: PrecisionAt }>();
  const sequences = schedule.map((row): Sequence => {
    const periods = kept.flatMap((period, index) => (isMeasured(row[period] ?? null) ? [index] : []));
    const times = periods.map((index) => kept[index] as number);
    const key = times.join();
    const pattern = patterns.get(key) ?? {
      index: patterns.size,
      precisionAt: precisionOver(times, correlations),
    };
    patterns.set(key, pattern);
    return { periods, treatments: times.map((period) => row[period] as number), pattern: pattern.index };
  });

  let known: { clusterSize: number; precisions: SquareMatrix[]; ofOneEach?: number } | undefined;
  const knownAt = (clusterSize: number) => {
    if (known?.clusterSize !== clusterSize) {
      const precisions = [...patterns.values()].map(({ precisionAt }) => precisionAt(clusterSize));
      known = { clusterSize, precisions };
    }
    return known;
  };
  const inDetail = (clusters: readonly number[], clusterSize: number) =>
    assemble(sequences, kept.length, patterns.size === 1, clusters, knownAt(clusterSize).precisions);

  return {
    inDetail,
    total: (clusters, clusterSize) => {
      const { within, mean } = variances(correlations, clusterSize);
      if (mean === 0) return Number.POSITIVE_INFINITY;
      if (within <= nearlyNothing * mean) {
        const precisions = sequences.map(
          ({ periods }, index) =>
            (clusters[index] as number) * meanPrecision(periods.length, correlations)(clusterSize),
        );
        const limit = limitingInformation(schedule, precisions);
        if (within === 0 || limit < Number.POSITIVE_INFINITY) return limit;
      }
      const [first = 0] = clusters;
      if (clusters.some((count) => count !== first)) return inDetail(clusters, clusterSize).total;
      const at = knownAt(clusterSize);
      at.ofOneEach ??= inDetail(Array<number>(clusters.length).fill(1), clusterSize).total;
      return first * at.ofOneEach;
    },
  };
}

/** Below this share of the variance that a cluster's periods have in common, their own is lost to rounding. */
const nearlyNothing = 1e-8;

/** What a cluster's period means have each of their own, were there no decay, and what all of its variance is. */
function variances(
  { icc, cac, iac = 0 }: Correlations,
  clusterSize: number,
): { within: number; mean: number } {
  return {
    within: icc * (1 - cac) + ((1 - icc) * (1 - iac)) / clusterSize,
    mean: icc + (1 - icc) / clusterSize,
  };
}

/** Within rounding of 0 or 1 a correlation is that, so that a limit is either singular or far from it. */
function settled(correlation: number): number {
  if (correlation < 1e-12) return 0;
  return correlation > 1 - 1e-12 ? 1 : correlation;
}

function assemble(
  sequences: readonly Sequence[],
  periods: number,
  complete: boolean,
  clusters: readonly number[],
  precisions: readonly SquareMatrix[],
): Information {
  const means = treatmentMeans(sequences, periods, clusters);
  const normal = zeroMatrix(complete ? 0 : periods + 1);
  const perCluster = sequences.map((sequence, index) => {
    const { entries: w } = precisions[sequence.pattern] as SquareMatrix;
    const count = sequence.periods.length;
    const k = clusters[index] as number;
    let form = 0;
    for (let i = 0; i < count; i += 1) {
      const row = sequence.periods[i] as number;
      let weighted = 0;
      for (let j = 0; j < count; j += 1) {
        const column = sequence.periods[j] as number;
        const entry = w[i * count + j] as number;
        weighted += entry * ((sequence.treatments[j] as number) - (means[column] as number));
        if (!complete) add(normal, row, column, k * entry);
      }
      if (!complete) add(normal, row, periods, k * weighted);
      form += weighted * ((sequence.treatments[i] as number) - (means[row] as number));
    }
    return form;
  });
  const known = perCluster.reduce((sum, form, index) => sum + form * (clusters[index] as number), 0);
  // In a complete schedule the centred treatments add up to 0 in every period, whatever the covariance.
  const takenByPeriods = complete ? 0 : -(schurComplement(normal, periods, 0).entries[0] as number);
  return { perCluster, takenByPeriods, total: known - takenByPeriods };
}

function treatmentMeans(
  sequences: readonly Sequence[],
  periods: number,
  clusters: readonly number[],
): Float64Array {
  const treated = new Float64Array(periods);
  const measured = new Float64Array(periods);
  sequences.forEach((sequence, index) => {
    const k = clusters[index] as number;
    sequence.periods.forEach((period, place) => {
      treated[period] = (treated[period] as number) + k * (sequence.treatments[place] as number);
      measured[period] = (measured[period] as number) + k;
    });
  });
  return treated.map((sum, period) => sum / (measured[period] as number));
}

function add(matrix: SquareMatrix, row: number, column: number, value: number): void {
  const at = row * matrix.order + column;
  matrix.entries[at] = (matrix.entries[at] as number) + value;
}
