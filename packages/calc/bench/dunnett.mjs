import { dunnettCriticalValue } from '../dist/distributions/dunnett.js';
import { inR, milliseconds, perSecond, report, worstDifference } from './measure.mjs';

/** Two-sided critical values of several arms against one control, beside mvtnorm's qmvt. */
export function dunnett() {
  const cases = [2, 3, 4, 5].flatMap((arms) =>
    [12, 40, 120, 508].flatMap((df) =>
      [1, Math.sqrt(arms)].map((control) => ({
        alpha: 0.05,
        df,
        // The last arm is a fifth larger than the others: no two correlations need be alike.
        loadings: Array.from({ length: arms }, (_, arm) => {
          const size = arm === arms - 1 ? 1.2 : 1;
          return Math.sqrt(size / (size + control));
        }),
      })),
    ),
  );
  const solve = () => cases.map(({ alpha, df, loadings }) => dunnettCriticalValue(alpha, 2, loadings, df));
  const ours = milliseconds(solve);
  console.log(`        Dunnett critical values: ${perSecond(cases.length, ours)}`);

  const padded = cases.map(({ alpha, df, loadings }) => [alpha, df, ...loadings, 0, 0, 0].slice(0, 7));
  const [seconds, ...values] = inR('dunnett.R', padded) ?? [];
  if (seconds === undefined) {
    console.log('        R with mvtnorm is not installed: no comparison with qmvt');
    return;
  }
  const exact = values.slice(cases.length);
  const times = (1000 * seconds) / ours;
  const [error, theirs] = [
    worstDifference(solve(), exact),
    worstDifference(values.slice(0, cases.length), exact),
  ];
  report('Dunnett critical values beside qmvt', `${times.toFixed(0)} × as fast`, {
    aim: '50 ×',
    kept: times >= 50,
  });
  report(
    'largest error of a critical value',
    `${error.toExponential(1)}, qmvt’s ${theirs.toExponential(1)}`,
    {
      aim: 'no larger than qmvt’s',
      kept: error <= theirs,
    },
  );
}
