import type { EntityManager } from '@mikro-orm/sqlite';

/** When anything of each study last changed, in whichever of its aggregates. */
export async function lastChanges(em: EntityManager, studyIds: string[]): Promise<Map<string, Date>> {
  const changes = await em.execute<{ study: string; changedAt: number }[]>(
    `select study, max(changed_at) as changedAt from (
       select id as study, changed_at from study
       union all select study_id, changed_at from planning_value
       union all select study_id, changed_at from cost_plan
       union all select study_id, changed_at from limits
       union all select study_id, changed_at from design_set
       union all select design_set.study_id, option.changed_at
         from option join design_set on design_set.id = option.design_set_id
     ) where study in (${studyIds.map(() => '?').join(', ')}) group by study`,
    studyIds,
  );
  return new Map(changes.map(({ study, changedAt }) => [study, new Date(changedAt)]));
}
