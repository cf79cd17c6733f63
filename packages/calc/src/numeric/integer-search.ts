export interface IntegerSearchOptions {
  /** The smallest integer allowed. */
  from: number;
  /** The largest integer allowed. */
  to: number;
  /** Where the answer is expected. Default `from`. */
  guess?: number;
  /** How many integers in a row below the answer must fail; more than 1 looks past dips. Default 0. */
  lookBelow?: number;
}

/**
 * The smallest integer from `from` to `to` that reaches what a mostly rising predicate asks.
 *
 * *Formula*: steps of 1, 1, 2, 4, … from the guess until the answer is bracketed, bisection between, then a walk below
 * the answer until `lookBelow` integers in a row fail. A guess that is right or one short costs two evaluations,
 * one that is one too large costs three.
 * *Returns* undefined where `to` itself does not reach, or where a bound is NaN.
 */
export function smallestInteger(
  reaches: (n: number) => boolean,
  { from, to, guess = from, lookBelow = 0 }: IntegerSearchOptions,
): number | undefined {
  if (!(from <= to)) return undefined;
  const start = Number.isNaN(guess) ? from : Math.min(to, Math.max(from, Math.round(guess)));
  let failing = from - 1;
  let answer = start;
  if (reaches(start)) {
    for (let step = 0.5; answer > from; step *= 2) {
      const below = Math.max(from, answer - Math.max(1, step));
      if (!reaches(below)) {
        failing = below;
        break;
      }
      answer = below;
    }
  } else {
    failing = start;
    for (let step = 0.5; ; step *= 2) {
      if (failing === to) return undefined;
      answer = Math.min(to, failing + Math.max(1, step));
      if (reaches(answer)) break;
      failing = answer;
    }
  }

  while (answer - failing > 1) {
    const middle = failing + Math.floor((answer - failing) / 2);
    if (reaches(middle)) answer = middle;
    else failing = middle;
  }

  for (let below = answer - 2; below >= from && answer - below <= lookBelow; below--) {
    if (reaches(below)) answer = below;
  }
  return answer;
}
