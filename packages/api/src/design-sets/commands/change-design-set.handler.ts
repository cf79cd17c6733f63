import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { invalid, stale } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import type { DesignSetView } from '../../contract/design-sets.js';
import { changedDesignSetSchema } from '../../contract/options.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { designSetView } from '../design-set.view.js';
import { loadDesignSet } from '../load-design-set.js';
import type { Option } from '../option.entity.js';
import { ChangeDesignSet } from './change-design-set.command.js';

@CommandHandler(ChangeDesignSet)
export class ChangeDesignSetHandler implements ICommandHandler<ChangeDesignSet> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: ChangeDesignSet): Promise<DesignSetView> {
    const { version, hold, order } = validated(changedDesignSetSchema, command.designSet);
    return this.changes.make(command, 'edit options', async ({ em, study, now, record }) => {
      const loaded = await loadDesignSet(em, study);
      const { designSet, options, removed } = loaded;
      if (designSet.version !== version) throw stale(designSetView(loaded));
      const inOrder = ordered(options, order);
      record({
        action: 'changed',
        what: 'what is held and the order of the options',
        before: { hold: designSet.hold, order: options.map(({ name }) => name) },
        after: { hold, order: inOrder.map(({ name }) => name) },
      });
      em.assign(designSet, {
        hold,
        optionIds: [...inOrder, ...removed].map(({ id }) => id),
        changedAt: now,
      });
      await em.flush();
      return designSetView({ designSet, options: inOrder, removed });
    });
  }
}

function ordered(options: Option[], order: string[]): Option[] {
  const found = order.flatMap((id) => options.find((option) => option.id === id) ?? []);
  if (order.length === options.length && new Set(found).size === options.length) return found;
  throw invalid([{ path: 'order', message: 'Name each option of the study once.' }]);
}
