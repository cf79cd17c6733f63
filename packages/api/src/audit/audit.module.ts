import { Module } from '@nestjs/common';
import { AuditController } from './audit.controller.js';
import { WhatHappenedInStudyHandler } from './queries/what-happened-in-study.handler.js';
import { WhatHappenedOnSiteHandler } from './queries/what-happened-on-site.handler.js';

@Module({
  controllers: [AuditController],
  providers: [WhatHappenedInStudyHandler, WhatHappenedOnSiteHandler],
})
export class AuditModule {}
