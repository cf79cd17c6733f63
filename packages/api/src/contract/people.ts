import { z } from 'zod';
import { emailSchema, newPasswordSchema, personNameSchema, personSchema } from './access.js';
import { versionSchema } from './versions.js';

/** Somebody with an account or, while `linkExpiresAt` is there, with a link that lets them set their password. */
export const accountSchema = personSchema.extend({ linkExpiresAt: z.iso.datetime().nullable() });

export const peopleSchema = z.object({ people: z.array(accountSchema) });

export const newAccountSchema = z.strictObject({
  name: personNameSchema,
  email: emailSchema,
  administrator: z.boolean().default(false),
});

/** The link is told once and kept nowhere; it works once, for seven days. */
export const invitationSchema = z.object({
  person: accountSchema,
  link: z.string(),
});

export const welcomeSchema = z.object({ name: z.string(), email: z.string() });

export const welcomePasswordSchema = z.strictObject({ password: newPasswordSchema });

export const profileSchema = personSchema.extend({ version: z.number().int() });

export const changedProfileSchema = z.strictObject({ version: versionSchema, name: personNameSchema });

export const changedPasswordSchema = z.strictObject({
  current: z.string().min(1, 'Enter your password as it is.').max(1024),
  next: newPasswordSchema,
});

export type AccountView = z.infer<typeof accountSchema>;
export type PeopleView = z.infer<typeof peopleSchema>;
export type NewAccount = z.input<typeof newAccountSchema>;
export type InvitationView = z.infer<typeof invitationSchema>;
export type WelcomeView = z.infer<typeof welcomeSchema>;
export type ProfileView = z.infer<typeof profileSchema>;
export type ChangedProfile = z.input<typeof changedProfileSchema>;
export type ChangedPassword = z.input<typeof changedPasswordSchema>;
