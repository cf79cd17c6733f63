import { Query } from '@nestjs/cqrs';
import type { StudyView } from '../../contract/studies.js';

export class WhichStudy extends Query<StudyView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
