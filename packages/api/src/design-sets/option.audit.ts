import type { Option } from './option.entity.js';

export const optionName = ({ name }: Option) => `option “${name}”`;

export const optionFacts = ({ name, plan }: Option) => ({ name, plan });
