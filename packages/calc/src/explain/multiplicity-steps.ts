import type { Step } from '../appraisal.js';
import type { Bound, Evaluated } from '../bind.js';
import type { Contrast } from '../tests/analysis.js';
import { criticalValue } from '../tests/one-bound.js';
import { tex } from './tex.js';

const dunnettSource =
  'Dunnett 1955, Journal of the American Statistical Association 50:1096; two-sided Dunnett 1964, Biometrics 20:482';
const holmSource = 'Holm 1979, Scandinavian Journal of Statistics 6:65';
const sequenceSource =
  'Maurer, Hothorn & Lehmacher 1995, Biometrie in der chemisch-pharmazeutischen Industrie 6:3';

/** From the type I error of the study to what each statistic must exceed. */
export function criticalValueSteps(bound: Bound, evaluated: Evaluated): Step[] {
  const { test } = bound.request;
  const { analysis, criticalValue: critical } = evaluated;
  const adjust = bound.plan.comparisons?.adjust;
  const count = analysis.contrasts.length;
  if (adjust === 'dunnett') return [...loadingSteps(bound, evaluated), dunnettStep(bound, evaluated)];
  if (adjust === 'holm') {
    return [
      ...loadingSteps(bound, evaluated),
      ...analysis.contrasts.map((_, step): Step => {
        const share = test.alpha / (count - step);
        return tailStep(bound, analysis.df, {
          label: `Critical value of step ${step + 1}, ${sidesOf(bound)}`,
          alpha: step === count - 1 ? '\\alpha' : `\\tfrac{\\alpha}{${count - step}}`,
          put: share,
          value: step === 0 ? critical : criticalValue(share / test.sides, analysis.df),
          source: holmSource,
        });
      }),
    ];
  }
  const each = bound.multiplicity.alphaPerComparison ?? test.alpha;
  const bonferroni: Step[] =
    adjust === 'bonferroni'
      ? [
          {
            label: 'Type I error of each comparison',
            formula: '\\alpha_c=\\alpha/C',
            substituted: `${tex(test.alpha)}/${count}`,
            value: each,
            source: 'Bonferroni’s inequality',
          },
        ]
      : [];
  return [
    ...loadingSteps(bound, evaluated),
    ...bonferroni,
    tailStep(bound, analysis.df, {
      label: `Critical value, ${sidesOf(bound)}`,
      alpha: adjust === 'bonferroni' ? '\\alpha_c' : '\\alpha',
      put: each,
      value: critical,
      source:
        adjust === 'fixed-sequence'
          ? `The whole type I error, in the order given: ${sequenceSource}`
          : analysis.df === null
            ? 'Normal distribution'
            : 'Student’s t distribution',
    }),
  ];
}

function sidesOf({ request: { test } }: Bound): string {
  if (test.hypothesis === 'equivalence') return 'of each of the two one-sided tests';
  return test.sides === 2 ? 'two-sided' : 'one-sided';
}

/** The value that a single statistic exceeds with a given probability. */
function tailStep(
  { request: { test } }: Bound,
  df: number | null,
  {
    label,
    alpha,
    put,
    value,
    source,
  }: { label: string; alpha: string; put: number; value: number; source: string },
): Step {
  const tail = put / test.sides;
  return {
    label,
    formula: `P(${df === null ? 'Z' : 'T_\\nu'}>c)=${test.sides === 2 ? `${alpha}/2` : alpha}`,
    substituted: `P(${df === null ? 'Z' : `T_{${tex(df)}}`}>c)=${tex(tail)}`,
    value,
    source,
  };
}

function holmLimits({ request: { test } }: Bound, { analysis: { df, contrasts } }: Evaluated): string {
  const limits = contrasts.map((_, step) =>
    criticalValue(test.alpha / (contrasts.length - step) / test.sides, df),
  );
  return `c=(${limits.map(tex).join(',\\,')})`;
}

/** How each comparison correlates with the others: one line for those of one size. */
function loadingSteps({ plan }: Bound, { analysis }: Evaluated): Step[] {
  const { contrasts } = analysis;
  return contrasts.flatMap(({ loading, arm }, index) => {
    if (loading === undefined || contrasts.findIndex((other) => other.loading === loading) < index) return [];
    const ratio = loading ** 2 / (1 - loading ** 2);
    const alike = contrasts.every((other) => other.loading === loading);
    return [
      {
        label: `Share of the control in ${alike ? 'each comparison' : `the comparison of ${plan.arms[arm]}`}; two correlate by the product of theirs`,
        formula: '\\lambda_i=\\sqrt{\\frac{r_i}{1+r_i}},\\quad r_i=\\frac{n_i}{n_0}',
        substituted: `\\sqrt{\\frac{${tex(ratio)}}{1+${tex(ratio)}}}`,
        value: loading,
        source: dunnettSource,
      },
    ];
  });
}

function dunnettStep(bound: Bound, { analysis, criticalValue: critical }: Evaluated): Step {
  const { sides, alpha } = bound.request.test;
  const max = sides === 2 ? '\\max_i|T_i|' : '\\max_iT_i';
  return {
    label: `Critical value, Dunnett, ${sidesOf(bound)}`,
    formula: `P\\!\\left(${max}\\le c\\right)=1-\\alpha,\\quad T_i=\\frac{\\lambda_iZ_0+\\sqrt{1-\\lambda_i^2}\\,Z_i}{S},\\quad \\nu S^2\\sim\\chi^2_\\nu`,
    substituted: `P\\!\\left(${max}\\le c\\right)=1-${tex(alpha)},\\quad \\lambda=(${loadingsOf(bound, analysis.contrasts)})${nuOf(analysis.df)}`,
    value: critical,
    source: dunnettSource,
  };
}

/** Negative where a superiority test is turned the other way than the first. */
function loadingsOf({ request }: Bound, contrasts: readonly Contrast[]): string {
  const turned = ({ effect }: Contrast) => request.test.hypothesis === 'superiority' && effect < 0;
  const [first] = contrasts;
  return contrasts
    .map((each) => {
      const { loading = 0 } = each;
      return tex(first && turned(each) !== turned(first) ? -loading : loading);
    })
    .join(',\\,');
}

const nuOf = (df: number | null) => (df === null ? ',\\quad S=1' : `,\\quad \\nu=${tex(df)}`);

/** Power of one comparison where others must reject before it; undefined where it stands by itself. */
export function dependentPowerStep(
  bound: Bound,
  evaluated: Evaluated,
  index: number,
  of: string,
): Step | undefined {
  const adjust = bound.plan.comparisons?.adjust;
  const { analysis, powers } = evaluated;
  const value = powers[index] as number;
  if (adjust === 'fixed-sequence') {
    const first = analysis.contrasts.slice(0, index + 1);
    return {
      label: `Power${of}`,
      formula: '1-\\beta_i=P(T_1>c,\\dots,T_i>c)',
      substituted: jointly(bound, evaluated, first, (i) => `T_{${i}}>${tex(evaluated.criticalValue)}`),
      value,
      source: sequenceSource,
    };
  }
  if (adjust === 'holm') {
    const limits = holmLimits(bound, evaluated);
    return {
      label: `Power${of}`,
      formula:
        '1-\\beta_i=P(T_i\\text{ is rejected}),\\quad T_{(1)}>c_1,\\;T_{(2)}>c_2,\\dots\\text{ until one fails}',
      substituted: jointly(
        bound,
        evaluated,
        analysis.contrasts,
        undefined,
        `T_{${index + 1}}\\text{ is rejected at }${limits}`,
      ),
      value,
      source: `${holmSource}; enumerated given the control’s mean and the pooled SD`,
    };
  }
  return undefined;
}

/** The chance that any, and that every comparison succeeds, where comparisons correlate. */
export function jointPowerSteps(bound: Bound, evaluated: Evaluated): Step[] {
  const { analysis, criticalValue: critical } = evaluated;
  const joint = bound.multiplicity.joint?.(analysis, critical, bound.test);
  if (!joint) return [];
  const adjust = bound.plan.comparisons?.adjust;
  const all = analysis.contrasts;
  const [first] = all;
  const any: Step = {
    label: 'Power that at least one comparison succeeds (disjunctive)',
    formula: adjust === 'fixed-sequence' ? 'P(T_1>c)' : '1-P(T_1\\le c,\\dots,T_K\\le c)',
    substituted:
      adjust === 'fixed-sequence'
        ? jointly(bound, evaluated, first ? [first] : [], (i) => `T_{${i}}>${tex(critical)}`)
        : `1-${jointly(bound, evaluated, all, (i) => `T_{${i}}\\le${tex(critical)}`)}`,
    value: joint.disjunctive,
    source:
      adjust === 'fixed-sequence'
        ? sequenceSource
        : adjust === 'holm'
          ? `${holmSource}: its first step is Bonferroni’s`
          : dunnettSource,
  };
  const every: Step = {
    label: 'Power that every comparison succeeds (conjunctive)',
    formula: adjust === 'holm' ? 'P(T_{(1)}>c_1,\\dots,T_{(K)}>c_K)' : 'P(T_1>c,\\dots,T_K>c)',
    substituted:
      adjust === 'holm'
        ? jointly(
            bound,
            evaluated,
            all,
            undefined,
            `\\text{all are rejected at }${holmLimits(bound, evaluated)}`,
          )
        : jointly(bound, evaluated, all, (i) => `T_{${i}}>${tex(critical)}`),
    value: joint.conjunctive,
    source: adjust === 'holm' ? holmSource : dunnettSource,
  };
  return [any, every];
}

/** A joint probability with all that it takes to compute it: noncentralities, λ and ν. */
function jointly(
  bound: Bound,
  { analysis }: Evaluated,
  contrasts: readonly Contrast[],
  event: ((index: number) => string) | undefined,
  words = '',
): string {
  const events = event ? contrasts.map((_, index) => event(index + 1)).join(',\\,') : words;
  const centres = contrasts
    .map(({ effect, standardError }) => tex(bound.test.distance(effect) / standardError))
    .join(',\\,');
  return `P\\!\\left(${events}\\mid\\delta/\\mathrm{SE}=(${centres}),\\ \\lambda=(${loadingsOf(bound, contrasts)})${nuOf(analysis.df)}\\right)`;
}
