import { Body, Controller, Post } from '@nestjs/common';
import { ApiBody, ApiOperation, ApiTags } from '@nestjs/swagger';
import { type AppraisalRequest, appraisalRequestSchema, appraise } from '@steelyard/calc';
import { createZodDto, ZodResponse } from 'nestjs-zod';
import { roundedReals } from '../common/significant-digits.js';
import { type AppraisalView, appraisalSchema } from '../contract/appraisals.js';

const twoArms: AppraisalRequest = {
  outcome: { kind: 'continuous', difference: 1, sd: 2.1 },
  test: { hypothesis: 'superiority', alpha: 0.05, sides: 2 },
  design: { family: 'parallel' },
  aim: { find: 'size', power: 0.9 },
  attrition: { participants: 0.12 },
};

class AppraisalRequestDto extends createZodDto(appraisalRequestSchema) {}
class AppraisalDto extends createZodDto(appraisalSchema) {}

@ApiTags('Appraisals')
@Controller('appraisals')
export class AppraisalsController {
  /** The body stays unchecked here: calc's own parsing says better what is wrong with a request. */
  @Post()
  @ApiOperation({ summary: 'Appraise one design: sizes, power, precision, money, months and cautions' })
  @ApiBody({ type: AppraisalRequestDto, examples: { twoArms: { summary: 'Two arms', value: twoArms } } })
  @ZodResponse({ status: 200, description: 'The appraisal', type: AppraisalDto })
  appraise(@Body() request: unknown): AppraisalView {
    return { ...roundedReals(appraise(request as AppraisalRequest)) };
  }
}
