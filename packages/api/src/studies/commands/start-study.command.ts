import { Command } from '@nestjs/cqrs';
import type { StudyView } from '../../contract/studies.js';
import type { StudyStart } from '../../contract/study-start.js';

/** Makes a study that can be weighed at once; whoever starts it becomes its methodologist. */
export class StartStudy extends Command<StudyView> {
  constructor(
    readonly personId: string,
    readonly study: StudyStart,
  ) {
    super();
  }
}
