import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { planningValuesOf } from '@steelyard/calc';
import { newAggregate } from '../../common/base.entity.js';
import { expectVersion } from '../../common/expect-version.js';
import { invalid } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { newPlanningValueSchema } from '../../contract/planning-values.js';
import type { PlanningValueView } from '../../contract/studies.js';
import { planningValueFacts, planningValueName } from '../planning-value.audit.js';
import { PlanningValue, type PlanningValueScope } from '../planning-value.entity.js';
import { planningValueView } from '../planning-value.view.js';
import { PlanningValueRevision } from '../planning-value-revision.entity.js';
import { StudyChanges } from '../study-changes.js';
import { SetPlanningValue } from './set-planning-value.command.js';

@CommandHandler(SetPlanningValue)
export class SetPlanningValueHandler implements ICommandHandler<SetPlanningValue> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: SetPlanningValue): Promise<PlanningValueView> {
    const { key, family, version, ...figures } = validated(newPlanningValueSchema, command.planningValue);
    if (family && !planningValuesOf(family).some((place) => place.key === key)) {
      throw invalid([{ path: 'family', message: 'Designs of this family do not draw on this value.' }]);
    }
    return this.changes.make(command, 'set planning values', async ({ em, study, by, now, record }) => {
      const scope: PlanningValueScope = family ?? 'every-family';
      const current = await em.findOne(PlanningValue, { study, key, scope }, { populate: ['setBy'] });
      expectVersion(current, version, planningValueView);
      const before = current ? planningValueFacts(current) : undefined;
      const changes = { ...figures, setBy: by, changedAt: now };
      const planningValue = current
        ? em.assign(current, changes)
        : em.create(PlanningValue, { ...newAggregate(now), study, key, scope, ...changes });
      record({
        action: current ? 'changed' : 'added',
        what: planningValueName(planningValue),
        ...(before && { before }),
        after: planningValueFacts(planningValue),
      });
      await em.flush();
      em.create(PlanningValueRevision, {
        planningValue,
        version: planningValue.version,
        ...figures,
        setBy: by,
        setAt: now,
      });
      return planningValueView(planningValue);
    });
  }
}
