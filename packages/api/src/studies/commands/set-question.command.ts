import { Command } from '@nestjs/cqrs';
import type { NewQuestion } from '../../contract/question.js';
import type { StudyView } from '../../contract/studies.js';

export class SetQuestion extends Command<StudyView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly question: NewQuestion,
  ) {
    super();
  }
}
