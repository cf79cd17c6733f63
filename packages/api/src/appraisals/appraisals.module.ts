import { Module } from '@nestjs/common';
import { AppraisalsController } from './appraisals.controller.js';

@Module({ controllers: [AppraisalsController] })
export class AppraisalsModule {}
