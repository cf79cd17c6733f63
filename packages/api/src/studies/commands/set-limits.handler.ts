import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { newAggregate } from '../../common/base.entity.js';
import { expectVersion } from '../../common/expect-version.js';
import { validated } from '../../common/validation.js';
import { type LimitsView, newLimitsSchema } from '../../contract/limits.js';
import { Limits } from '../limits.entity.js';
import { limitsView } from '../limits.view.js';
import { StudyChanges } from '../study-changes.js';
import { SetLimits } from './set-limits.command.js';

@CommandHandler(SetLimits)
export class SetLimitsHandler implements ICommandHandler<SetLimits> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: SetLimits): Promise<LimitsView> {
    const { limits, version } = validated(newLimitsSchema, command.limits);
    return this.changes.make(command, 'set limits', async ({ em, study, now, record }) => {
      const current = await em.findOne(Limits, { study });
      expectVersion(current, version, limitsView);
      record({
        action: current ? 'changed' : 'added',
        what: 'limits',
        ...(current && { before: current.limits }),
        after: limits,
      });
      const changed = current
        ? em.assign(current, { limits, changedAt: now })
        : em.create(Limits, { ...newAggregate(now), study, limits });
      await em.flush();
      return limitsView(changed);
    });
  }
}
