import type { Step } from '../../appraisal.js';
import { normalQuantile, normalUpperQuantile } from '../../distributions/normal.js';
import { tex, texFactor } from '../../explain/tex.js';
import type { OutcomeModel } from '../../outcomes/outcome-model.js';
import { requiredEvents } from '../../outcomes/time-to-event.js';
import type { RequestFor, TimeToEventOutcome } from '../../request.js';
import { singleTest } from '../../tests/single-test.js';

/** Events that the aim requires, at the allocation asked for; none for a power aim or for equivalence. */
export function eventsRequired(
  request: RequestFor<unknown>,
  outcome: TimeToEventOutcome,
  allocation: readonly number[],
  { effect }: OutcomeModel,
): number | undefined {
  const { test, aim } = request;
  if (!('power' in aim) || test.hypothesis === 'equivalence') return undefined;
  return requiredEvents(
    normalUpperQuantile(test.alpha / test.sides) + normalQuantile(aim.power),
    (allocation[1] as number) / (allocation[0] as number),
    singleTest(test, outcome).distance(effect),
    outcome.method,
    Math.exp(effect),
  );
}

/** The line of the working for the events required. */
export function requiredEventsStep(
  request: RequestFor<unknown>,
  outcome: TimeToEventOutcome,
  allocation: readonly number[],
  model: OutcomeModel,
): Step[] {
  const required = eventsRequired(request, outcome, allocation, model);
  const { test, aim } = request;
  if (required === undefined || !('power' in aim)) return [];
  const alpha = normalUpperQuantile(test.alpha / test.sides);
  const beta = normalQuantile(aim.power);
  const r = (allocation[1] as number) / (allocation[0] as number);
  const z = `(${tex(alpha)}+${texFactor(beta)})^2`;
  if (outcome.method === 'freedman') {
    const ratio = Math.exp(model.effect);
    return [
      {
        label: 'Events required, before rounding',
        formula:
          'D=\\frac{(z_\\alpha+z_\\beta)^2(1+r\\,\\mathrm{HR})^2}{r\\,(1-\\mathrm{HR})^2},\\quad r\\text{ the allocation}',
        substituted: `\\frac{${z}\\times(1+${texFactor(r)}\\times${texFactor(ratio)})^2}{${texFactor(r)}\\times(1-${texFactor(ratio)})^2}`,
        value: required,
        source: 'Freedman 1982, Stat Med 1:121',
      },
    ];
  }
  const distance = singleTest(test, outcome).distance(model.effect);
  return [
    {
      label: 'Events required, before rounding',
      formula: `D=\\frac{(z_\\alpha+z_\\beta)^2(1+r)^2}{r\\,${test.hypothesis === 'superiority' ? '\\delta^2' : 'd^2'}},\\quad r\\text{ the allocation}`,
      substituted: `\\frac{${z}\\times(1+${texFactor(r)})^2}{${texFactor(r)}\\times${texFactor(distance)}^2}`,
      value: required,
      source: 'Schoenfeld 1983, Biometrics 39:499',
    },
  ];
}
