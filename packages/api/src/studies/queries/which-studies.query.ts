import { Query } from '@nestjs/cqrs';
import type { StudiesView } from '../../contract/studies.js';

/** The studies in which a person has a part. */
export class WhichStudies extends Query<StudiesView> {
  constructor(readonly personId: string) {
    super();
  }
}
