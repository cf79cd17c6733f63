import type { OutcomeModel } from './outcome-model.js';

/** The last ratio that a target may come near. */
const largestRatio = 1e12;

interface RatioTarget {
  kind: OutcomeModel['kind'];
  /** As in “hazard ratio”. */
  name: string;
  path: string;
  ratio: number;
}

/** What an outcome makes of a log ratio, after dilution. */
type RatioParts = Pick<OutcomeModel, 'variances'> &
  Partial<Pick<OutcomeModel, 'variance' | 'eventProbabilities' | 'expectedCounts' | 'categories'>>;

/**
 * An outcome whose effect is a log ratio, active over control: no effect at 1, a normal reference, and dilution
 * that multiplies the log.
 */
export function ratioModel(
  { kind, name, path, ratio }: RatioTarget,
  dilution: number,
  partsAt: (logRatio: number) => RatioParts,
): OutcomeModel {
  const at = (target: number): OutcomeModel => {
    const effect = dilution * Math.log(target);
    const targetLimit = target > 1 ? largestRatio : 1 / largestRatio;
    return {
      kind,
      target,
      targetPath: path,
      refuseTarget: (other) =>
        other >= 1 / largestRatio && other <= largestRatio ? undefined : `The ${name} must be above 0.`,
      nullTarget: 1,
      targetLimit,
      targetAlong: (share) => targetLimit ** share,
      effect,
      dilution,
      reference: 'normal',
      unequalVariances: false,
      covariates: 0,
      varianceFixed: false,
      at,
      ...partsAt(effect),
    };
  };
  return at(ratio);
}
