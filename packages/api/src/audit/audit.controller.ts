import { Controller, Get, Param, Query, UseGuards } from '@nestjs/common';
import { QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { AdministratorGuard } from '../common/administrator.guard.js';
import { CurrentPerson } from '../common/current-person.decorator.js';
import type { PersonView } from '../contract/access.js';
import { type AuditView, auditPageSchema, auditSchema } from '../contract/audit.js';
import { WhatHappenedInStudy } from './queries/what-happened-in-study.query.js';
import { WhatHappenedOnSite } from './queries/what-happened-on-site.query.js';

class AuditPageDto extends createZodDto(auditPageSchema) {}
class AuditDto extends createZodDto(auditSchema) {}

@ApiTags('Audit')
@Controller()
export class AuditController {
  constructor(private readonly queries: QueryBus) {}

  @Get('studies/:studyId/history')
  @ApiOperation({ summary: 'Who did what in a study, newest first' })
  @ZodResponse({ status: 200, description: 'A page of entries', type: AuditDto })
  studyHistory(
    @Param('studyId') studyId: string,
    @CurrentPerson() person: PersonView,
    @Query() page: AuditPageDto,
  ): Promise<AuditView> {
    return this.queries.execute(new WhatHappenedInStudy(studyId, person.id, page));
  }

  @UseGuards(AdministratorGuard)
  @Get('audit')
  @ApiOperation({ summary: 'Who did what to people and their accounts, newest first' })
  @ZodResponse({ status: 200, description: 'A page of entries', type: AuditDto })
  siteAudit(@Query() page: AuditPageDto): Promise<AuditView> {
    return this.queries.execute(new WhatHappenedOnSite(page));
  }
}
