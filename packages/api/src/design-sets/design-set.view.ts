import type { DesignSetView, OptionView } from '../contract/design-sets.js';
import type { DesignSet } from './design-set.entity.js';
import type { Option } from './option.entity.js';

export const designSetView = ({ id, version, hold }: DesignSet, options: Option[]): DesignSetView => ({
  id,
  version,
  hold,
  options: options.map(optionView),
});

const optionView = ({ id, version, name, plan }: Option): OptionView => ({ id, version, name, plan });
