import type { EntityManager } from '@mikro-orm/sqlite';
import { CommandHandler, type ICommandHandler } from '@nestjs/cqrs';
import { invalid, stale } from '../../common/problem.js';
import { validated } from '../../common/validation.js';
import { newQuestionSchema } from '../../contract/question.js';
import type { StudyView } from '../../contract/studies.js';
import { Option } from '../../design-sets/option.entity.js';
import { readStudy } from '../read-study.js';
import type { Study } from '../study.entity.js';
import { StudyChanges } from '../study-changes.js';
import { SetQuestion } from './set-question.command.js';

@CommandHandler(SetQuestion)
export class SetQuestionHandler implements ICommandHandler<SetQuestion> {
  constructor(private readonly changes: StudyChanges) {}

  async execute(command: SetQuestion): Promise<StudyView> {
    const { version, ...question } = validated(newQuestionSchema, command.question);
    return this.changes.make(
      command,
      'change the question',
      async ({ em, study, membership, now, record }) => {
        if (study.version !== version) throw stale(await readStudy(em, membership));
        await checkTreatments(em, study, question.treatments.length);
        const before = Object.fromEntries(
          Object.keys(question).map((key) => [key, study[key as keyof typeof question] ?? null]),
        );
        record({ action: 'changed', what: 'the question', before, after: question });
        em.assign(study, { ...question, changedAt: now });
        await em.flush();
        return readStudy(em, membership);
      },
    );
  }
}

/** Options name treatments by their place, so that none may lose the place it names. */
async function checkTreatments(em: EntityManager, study: Study, treatments: number): Promise<void> {
  const options = await em.find(Option, { designSet: { study } });
  const needed = Math.max(...options.flatMap(({ plan }) => plan.treatments.map((place) => place + 1)), 0);
  if (treatments < needed) {
    const message = `Options of this study compare its first ${needed} treatments: change them first.`;
    throw invalid([{ path: 'treatments', message }]);
  }
}
