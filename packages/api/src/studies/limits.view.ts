import type { LimitsView } from '../contract/limits.js';
import type { Limits } from './limits.entity.js';

export const limitsView = (limits: Limits | null): LimitsView => ({
  version: limits?.version ?? null,
  limits: limits?.limits ?? {},
});
