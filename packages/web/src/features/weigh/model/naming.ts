import type { CostLine, Feasible } from '@steelyard/calc';

/** A cost line's label with the study's own name for the arm that the calculation calls control or active. */
export function lineName({ label }: CostLine, { arms }: Feasible, names: readonly string[]): string {
  const arm = arms.findIndex((each) => label.endsWith(`, ${each.label}`));
  const generic = arms[arm]?.label;
  const name = names[arm];
  return generic === undefined || name === undefined ? label : label.slice(0, -generic.length) + name;
}
