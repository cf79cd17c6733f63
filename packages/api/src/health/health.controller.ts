import { EntityManager } from '@mikro-orm/sqlite';
import { Controller, Get } from '@nestjs/common';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { Public } from '../common/public.decorator.js';
import { type HealthView, healthSchema } from '../contract/health.js';
import { version } from './version.js';

class HealthDto extends createZodDto(healthSchema) {}

@ApiTags('Health')
@Controller('health')
export class HealthController {
  constructor(private readonly em: EntityManager) {}

  @Public()
  @Get()
  @ApiOperation({ summary: 'Whether the server and its database answer' })
  @ZodResponse({ status: 200, description: 'They do', type: HealthDto })
  async health(): Promise<HealthView> {
    await this.em.fork().execute('select 1');
    return { status: 'ok', version, database: 'ok' };
  }
}
