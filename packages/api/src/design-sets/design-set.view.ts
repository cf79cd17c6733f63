import type { ChoiceView, DesignSetView, OptionView, RemovedOptionView } from '../contract/design-sets.js';
import type { DesignSet } from './design-set.entity.js';
import type { LoadedDesignSet } from './load-design-set.js';
import type { Option } from './option.entity.js';

export const designSetView = ({ designSet, options, removed }: LoadedDesignSet): DesignSetView => ({
  id: designSet.id,
  version: designSet.version,
  hold: designSet.hold,
  options: options.map(optionView),
  removed: removed.map(removedOptionView),
  choice: choiceView(designSet),
});

export const optionView = ({ id, version, name, plan, ruling, ruledBy, ruledAt }: Option): OptionView => ({
  id,
  version,
  name,
  plan,
  ruling: ruling && ruledAt ? { ...ruling, by: ruledBy?.name ?? '', at: ruledAt.toISOString() } : null,
});

const removedOptionView = (option: Option): RemovedOptionView => ({
  ...optionView(option),
  removedAt: (option.removedAt ?? option.changedAt).toISOString(),
});

const choiceView = ({ choice, chosenBy }: DesignSet): ChoiceView | null =>
  choice ? { ...choice, by: chosenBy?.name ?? '' } : null;
