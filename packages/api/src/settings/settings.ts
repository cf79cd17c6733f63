import { resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { type ConfigType, registerAs } from '@nestjs/config';
import { z } from 'zod';

const projectRoot = fileURLToPath(new URL('../../../../', import.meta.url));

const schema = z.object({
  PORT: z.coerce.number().int().min(1).max(65_535).default(4310),
  HOST: z.string().default('127.0.0.1'),
  STEELYARD_DATA: z.string().default(resolve(projectRoot, 'data')),
  STEELYARD_DEMO: z.enum(['on', 'off']).default('on'),
  STEELYARD_URL: z.url({ protocol: /^https?$/ }).optional(),
  STEELYARD_SECURE_COOKIES: z.enum(['on', 'off']).default('off'),
});

type Name = keyof z.infer<typeof schema>;

const sentences: Record<Name, (value: string) => string> = {
  PORT: (value) => `PORT must be a whole number from 1 to 65535, not “${value}”.`,
  HOST: (value) => `HOST must be an address to listen on, such as 127.0.0.1, not “${value}”.`,
  STEELYARD_DATA: (value) => `STEELYARD_DATA must be the path of a folder, not “${value}”.`,
  STEELYARD_DEMO: (value) => `STEELYARD_DEMO must be “on” or “off”, not “${value}”.`,
  STEELYARD_URL: (value) =>
    `STEELYARD_URL must be the address people reach this server by, such as https://steelyard.example.org, not “${value}”.`,
  STEELYARD_SECURE_COOKIES: (value) => `STEELYARD_SECURE_COOKIES must be “on” or “off”, not “${value}”.`,
};

export class SettingsError extends Error {
  constructor(readonly sentences: string[]) {
    super(sentences.join(' '));
  }
}

/** Reads the settings from the environment; an empty value counts as none. Throws SettingsError, a sentence each. */
export function readSettings(environment: Record<string, string | undefined>) {
  const given = Object.fromEntries(Object.entries(environment).filter(([, value]) => value?.trim()));
  const result = schema.safeParse(given);
  if (!result.success) {
    const wrong = new Set(result.error.issues.map((issue) => issue.path[0] as Name));
    throw new SettingsError([...wrong].map((name) => sentences[name](given[name] ?? '')));
  }
  const { PORT, HOST, STEELYARD_DATA, STEELYARD_DEMO, STEELYARD_URL, STEELYARD_SECURE_COOKIES } = result.data;
  return {
    port: PORT,
    host: HOST,
    database: resolve(STEELYARD_DATA, 'steelyard.sqlite'),
    demo: STEELYARD_DEMO === 'on',
    url: STEELYARD_URL ? new URL(STEELYARD_URL).origin : null,
    secureCookies: STEELYARD_SECURE_COOKIES === 'on',
  };
}

export const appSettings = registerAs('settings', () => readSettings(process.env));
export type Settings = ConfigType<typeof appSettings>;
