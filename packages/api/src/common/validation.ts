import type { PipeTransform, Type } from '@nestjs/common';
import { createZodValidationPipe } from 'nestjs-zod';
import { z } from 'zod';
import { invalid } from './problem.js';

function problemOf(error: z.core.$ZodError) {
  return invalid(
    error.issues.flatMap(({ path, message, ...issue }) => {
      const fields = issue.code === 'unrecognized_keys' ? issue.keys.map((key) => [...path, key]) : [path];
      return fields.map((field) => ({ path: field.join('.'), message }));
    }),
  );
}

/** Checks the body of a request against the schema of its DTO. */
export const BodyValidationPipe: Type<PipeTransform> = createZodValidationPipe({
  createValidationException: (error) => problemOf(error as z.core.$ZodError),
});

/** Checks what a command was given; throws a problem that names each field at fault. */
export function validated<T>(schema: z.ZodType<T>, value: unknown): T {
  const result = schema.safeParse(value);
  if (!result.success) throw problemOf(result.error);
  return result.data;
}
