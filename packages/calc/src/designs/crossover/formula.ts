import {
  positiveDefiniteInverse,
  type SquareMatrix,
  schurComplement,
  zeroMatrix,
} from '../../numeric/linear-algebra.js';
import { lettersOf } from './schema.js';

/** What one participant in each sequence tells of the treatments, for σ²(1 − ρ) = 1. */
export interface TreatmentInformation {
  /** Of the active treatments against A, with periods and carryover fitted. */
  information: SquareMatrix;
  /** The variance of each active treatment's difference from A; none where one cannot be estimated. */
  variances?: readonly number[];
  /** The first active treatment whose difference from A cannot be told from what else is fitted. */
  notEstimable?: string;
}

/**
 * The treatment differences of a crossover analysed within participants.
 *
 * *Formula*: X′(I − J/T)X summed over the sequences, X holding periods, first-order carryover where asked for
 * and treatments; its Schur complement on the treatments, and the diagonal of that one's inverse.
 * *Source*: Jones & Kenward 2014, Design and Analysis of Cross-Over Trials, 3rd ed., chapter 5; Senn 2002.
 * *Units*: σ²(1 − ρ) = 1 and one participant in each sequence.
 * *Accuracy*: relative 1e-12 (crossover/cases.json).
 */
export function treatmentInformation(sequences: readonly string[], carryover: boolean): TreatmentInformation {
  const letters = lettersOf(sequences);
  const active = letters.length - 1;
  const periods = sequences[0]?.length ?? 0;
  const nuisance = periods - 1 + (carryover ? active : 0);
  const normal = zeroMatrix(nuisance + active);
  for (const sequence of sequences) {
    const given = [...sequence].map((letter) => letters.indexOf(letter));
    const columns = [
      ...Array.from({ length: periods - 1 }, (_, index) => given.map((_, period) => period === index + 1)),
      ...(carryover
        ? Array.from({ length: active }, (_, index) =>
            given.map((_, period) => given[period - 1] === index + 1),
          )
        : []),
      ...Array.from({ length: active }, (_, index) => given.map((treatment) => treatment === index + 1)),
    ].map(centred);
    columns.forEach((left, i) => {
      columns.forEach((right, j) => {
        const at = i * normal.order + j;
        normal.entries[at] =
          (normal.entries[at] as number) +
          left.reduce((sum, value, period) => sum + value * (right[period] as number), 0);
      });
    });
  }
  const information = schurComplement(normal, nuisance);
  const scale = Array.from(
    { length: active },
    (_, k) => normal.entries[(nuisance + k) * (normal.order + 1)] as number,
  );
  const inverted = positiveDefiniteInverse(information, scale);
  if ('dependent' in inverted) {
    return { information, notEstimable: letters[inverted.dependent + 1] as string };
  }
  const variances = scale.map((_, k) => inverted.inverse.entries[k * (active + 1)] as number);
  return { information, variances };
}

/** A participant's own level is free, so each column counts by its deviations from its mean. */
function centred(column: readonly boolean[]): number[] {
  const mean = column.filter(Boolean).length / column.length;
  return column.map((value) => (value ? 1 : 0) - mean);
}

/**
 * Degrees of freedom of a crossover with participants, periods and treatments fitted.
 *
 * *Formula*: NT − N − (T − 1) − (K − 1), less another K − 1 with carryover.
 * *Source*: Jones & Kenward 2014. *Units*: N participants, T periods, K treatments.
 */
export function crossoverDf(
  participants: number,
  periods: number,
  treatments: number,
  carryover: boolean,
): number {
  const fitted = (treatments - 1) * (carryover ? 2 : 1);
  return participants * (periods - 1) - (periods - 1) - fitted;
}
