import { Query } from '@nestjs/cqrs';
import type { DesignSetView } from '../../contract/design-sets.js';

export class WhichOptions extends Query<DesignSetView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
