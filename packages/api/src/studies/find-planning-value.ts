import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound } from '../common/problem.js';
import { PlanningValue } from './planning-value.entity.js';
import type { Study } from './study.entity.js';

export async function findPlanningValue(em: EntityManager, study: Study, id: string): Promise<PlanningValue> {
  const planningValue = await em.findOne(PlanningValue, { id, study }, { populate: ['setBy'] });
  if (!planningValue) throw notFound('There is no such planning value in this study.');
  return planningValue;
}
