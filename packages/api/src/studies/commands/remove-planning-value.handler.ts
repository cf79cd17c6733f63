import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { expectVersion } from '../../common/expect-version.js';
import { invalid } from '../../common/problem.js';
import { findPlanningValue } from '../find-planning-value.js';
import { planningValueFacts, planningValueName } from '../planning-value.audit.js';
import { planningValueView } from '../planning-value.view.js';
import { StudyChanges } from '../study-changes.js';
import { RemovePlanningValue } from './remove-planning-value.command.js';

@CommandHandler(RemovePlanningValue)
export class RemovePlanningValueHandler implements ICommandHandler<RemovePlanningValue> {
  constructor(private readonly changes: StudyChanges) {}

  execute(command: RemovePlanningValue): Promise<void> {
    return this.changes.make(command, 'set planning values', async ({ em, study, record }) => {
      const planningValue = await findPlanningValue(em, study, command.planningValueId);
      expectVersion(planningValue, command.version, planningValueView);
      if (planningValue.scope === 'every-family') {
        throw invalid([{ path: 'family', message: 'Only the value of a single family can be removed.' }]);
      }
      record({
        action: 'removed',
        what: planningValueName(planningValue),
        before: planningValueFacts(planningValue),
      });
      em.remove(planningValue);
    });
  }
}
