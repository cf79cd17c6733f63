import { Command } from '@nestjs/cqrs';
import { z } from 'zod';
import { emailSchema, newPasswordSchema, personNameSchema } from '../../contract/access.js';

export const newPersonSchema = z.strictObject({
  name: personNameSchema,
  email: emailSchema,
  password: newPasswordSchema,
  administrator: z.boolean(),
});

/** Answers with the person's id. */
export class CreatePerson extends Command<string> {
  constructor(readonly person: z.input<typeof newPersonSchema>) {
    super();
  }
}
