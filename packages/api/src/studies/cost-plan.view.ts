import type { CostPlanView } from '../contract/studies.js';
import type { CostPlan } from './cost-plan.entity.js';

export const costPlanView = ({ version, costs, timeline, source }: CostPlan): CostPlanView => ({
  version,
  costs,
  timeline,
  source: source ?? null,
});
