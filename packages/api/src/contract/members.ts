import { z } from 'zod';
import { emailSchema, personSchema } from './access.js';
import { studyRoles } from './studies.js';

export const membersSchema = z.object({
  members: z.array(
    z.object({
      person: personSchema.pick({ id: true, name: true, email: true }),
      role: z.enum(studyRoles),
    }),
  ),
});

/** Adds a person or changes their role. */
export const newMemberSchema = z.strictObject({
  email: emailSchema,
  role: z.enum(studyRoles, { error: 'Choose a role.' }),
});

export type MembersView = z.infer<typeof membersSchema>;
export type NewMember = z.input<typeof newMemberSchema>;
