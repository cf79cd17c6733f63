import { NestFactory } from '@nestjs/core';
import { AppModule } from './app.module.js';
import { runProcess, say } from './console.js';
import { DemoSeeder } from './demo/demo-seeder.js';
import { migrate, prepareFolder } from './open-database.js';
import { type Settings, SettingsError } from './settings/settings.js';

await runProcess(reset);

async function reset(settings: Settings): Promise<void> {
  if (!settings.demo) throw new SettingsError(['STEELYARD_DEMO is “off”: nothing was changed.']);
  say(`Opening the database ${settings.database}`);
  prepareFolder(settings);
  const app = await NestFactory.createApplicationContext(AppModule, { logger: false, abortOnError: false });
  await migrate(app);
  const seeder = app.get(DemoSeeder);
  if (!(await seeder.mayEmpty())) {
    throw new SettingsError([
      `The database ${settings.database} was not made by the demo: people work with it. Nothing was changed.`,
    ]);
  }
  say('Emptying the database and seeding the demo.');
  await seeder.seed();
  await app.close();
  say('The demo is as it was at first.');
}
