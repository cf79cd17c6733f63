import { z } from 'zod';

export const emailSchema = z
  .string()
  .trim()
  .toLowerCase()
  .max(254, 'An e-mail address has 254 characters or fewer.')
  .pipe(z.email('Enter an e-mail address, such as ada@example.org.'));

export const signInSchema = z.strictObject({
  email: emailSchema,
  password: z.string().min(1, 'Enter your password.').max(1024),
});

export const personNameSchema = z.string().trim().min(1, 'Enter your name.').max(200);

export const newPasswordSchema = z
  .string()
  .min(12, 'Choose a password of 12 characters or more.')
  .max(1024, 'Choose a password of 1024 characters or fewer.');

/** Creates the first administrator of an empty installation; the code is printed on the server's console. */
export const firstVisitSchema = z.strictObject({
  code: z.string().trim().min(1, 'Enter the code printed on the server’s console.').max(200),
  name: personNameSchema,
  email: emailSchema,
  password: newPasswordSchema,
});

export const personSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  administrator: z.boolean(),
});

export const demoAccountSchema = z.object({
  name: z.string(),
  email: z.string(),
  /** What the person does in the demo studies, as in “Methodologist, Stillfoot”. */
  part: z.string(),
});

/** What the sign-in page needs before anyone has signed in. */
export const accessSchema = z.object({
  firstVisit: z.boolean(),
  demo: z.object({ password: z.string(), accounts: z.array(demoAccountSchema) }).nullable(),
});

export type SignIn = z.infer<typeof signInSchema>;
export type FirstVisit = z.infer<typeof firstVisitSchema>;
export type PersonView = z.infer<typeof personSchema>;
export type DemoAccount = z.infer<typeof demoAccountSchema>;
export type AccessView = z.infer<typeof accessSchema>;
