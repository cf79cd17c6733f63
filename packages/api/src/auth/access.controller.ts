import { Controller, Get } from '@nestjs/common';
import { QueryBus } from '@nestjs/cqrs';
import { ApiOperation, ApiTags } from '@nestjs/swagger';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { Public } from '../common/public.decorator.js';
import { type AccessView, accessSchema } from '../contract/access.js';
import { HowToEnter } from './queries/how-to-enter.query.js';

class AccessDto extends createZodDto(accessSchema) {}

@ApiTags('Access')
@Controller('access')
export class AccessController {
  constructor(private readonly queries: QueryBus) {}

  @Public()
  @Get()
  @ApiOperation({ summary: 'How people enter: by the first visit, by a demo account or by their own' })
  @ZodResponse({ status: 200, description: 'What the sign-in page needs', type: AccessDto })
  access(): Promise<AccessView> {
    return this.queries.execute(new HowToEnter());
  }
}
