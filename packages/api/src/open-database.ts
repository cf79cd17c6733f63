import { mkdirSync } from 'node:fs';
import { dirname } from 'node:path';
import { MikroORM } from '@mikro-orm/sqlite';
import type { INestApplicationContext } from '@nestjs/common';
import { type Settings, SettingsError } from './settings/settings.js';

/** Makes the folder of the database, so that a path that cannot be is named before anything starts. */
export function prepareFolder({ database }: Settings): void {
  const folder = dirname(database);
  try {
    mkdirSync(folder, { recursive: true });
  } catch {
    throw new SettingsError([`STEELYARD_DATA must be a folder that can be written to, not “${folder}”.`]);
  }
}

/** Brings the database up to date and answers how many steps that took; nothing else shapes it. */
export async function migrate(app: INestApplicationContext): Promise<number> {
  const steps = await app.get(MikroORM).getMigrator().up();
  return steps.length;
}
