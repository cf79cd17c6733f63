import { Query } from '@nestjs/cqrs';
import type { AuditPage, AuditView } from '../../contract/audit.js';

export class WhatHappenedInStudy extends Query<AuditView> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly page: AuditPage,
  ) {
    super();
  }
}
