import { Command } from '@nestjs/cqrs';
import { holdSchema } from '@steelyard/calc';
import { z } from 'zod';

export const newDesignSetSchema = z.strictObject({ hold: holdSchema });

/** Answers with the design set's id. */
export class CreateDesignSet extends Command<string> {
  constructor(
    readonly studyId: string,
    readonly personId: string,
    readonly designSet: z.input<typeof newDesignSetSchema>,
  ) {
    super();
  }
}
