import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { invalid, stale } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import type { Choice, DesignSetView } from '../../contract/design-sets.js';
import { newChoiceSchema } from '../../contract/options.js';
import { StudyChanges } from '../../studies/study-changes.js';
import { choiceFacts } from '../choice.audit.js';
import { designSetView } from '../design-set.view.js';
import { loadDesignSet } from '../load-design-set.js';
import type { Option } from '../option.entity.js';
import { RecordChoice } from './record-choice.command.js';

type Reasons = Omit<Choice, 'at'>;

@CommandHandler(RecordChoice)
export class RecordChoiceHandler implements ICommandHandler<RecordChoice> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: RecordChoice): Promise<DesignSetView> {
    const { version, ...given } = validated(newChoiceSchema, command.choice);
    return this.changes.make(command, 'record the choice', async ({ em, study, by, now, record }) => {
      const loaded = await loadDesignSet(em, study);
      const { designSet, options, removed } = loaded;
      if (designSet.version !== version) throw stale(designSetView(loaded));
      checkChoice(given, options);
      const all = [...options, ...removed];
      record({
        action: 'chose',
        what: `option “${options.find(({ id }) => id === given.optionId)?.name}”`,
        ...(designSet.choice && { before: choiceFacts(designSet.choice, all) }),
        after: choiceFacts(given, all),
      });
      em.assign(designSet, { choice: { ...given, at: now.toISOString() }, chosenBy: by, changedAt: now });
      await em.flush();
      return designSetView(loaded);
    });
  }
}

/** The choice is one that may be chosen; every other is either ruled out already or has its reason here. */
function checkChoice({ optionId, whyNot }: Reasons, options: Option[]): void {
  const chosen = options.find(({ id }) => id === optionId);
  if (!chosen) throw invalid([{ path: 'optionId', message: 'Choose one of the study’s options.' }]);
  if (chosen.ruling?.kind === 'not-admissible') {
    throw invalid([{ path: 'optionId', message: 'This option is ruled out: choose another.' }]);
  }
  const others = options.filter(({ id }) => id !== optionId);
  const misplaced = whyNot.findIndex(
    (reason, place) =>
      !others.some(({ id }) => id === reason.optionId) ||
      whyNot.findIndex(({ optionId }) => optionId === reason.optionId) !== place,
  );
  if (misplaced >= 0) {
    const message = 'Give one reason for each of the other options.';
    throw invalid([{ path: `whyNot.${misplaced}.optionId`, message }]);
  }
  const silent = others.filter(
    ({ id, ruling }) => ruling?.kind !== 'not-admissible' && !whyNot.some(({ optionId }) => optionId === id),
  );
  if (silent.length > 0) {
    const names = silent.map(({ name }) => `“${name}”`).join(', ');
    throw invalid([{ path: 'whyNot', message: `Say why not ${names}.` }]);
  }
}
