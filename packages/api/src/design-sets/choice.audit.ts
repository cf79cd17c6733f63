import type { Choice } from '../contract/design-sets.js';
import type { Option } from './option.entity.js';

/** A choice with its options by name. */
export function choiceFacts({ optionId, why, whyNot }: Omit<Choice, 'at'>, options: Option[]) {
  const nameOf = (id: string) => options.find((option) => option.id === id)?.name ?? id;
  return {
    option: nameOf(optionId),
    why,
    whyNot: Object.fromEntries(whyNot.map((reason) => [nameOf(reason.optionId), reason.why])),
  };
}
