import { Query } from '@nestjs/cqrs';
import type { WeighView } from '../../contract/design-sets.js';

export class HowDoOptionsWeigh extends Query<WeighView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
  ) {
    super();
  }
}
