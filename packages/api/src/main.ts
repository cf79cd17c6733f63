import { NestFactory } from '@nestjs/core';
import { QueryBus } from '@nestjs/cqrs';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module.js';
import { FirstVisitCode } from './auth/first-visit-code.js';
import { HowToEnter } from './auth/queries/how-to-enter.query.js';
import { appOptions, configureApp } from './configure-app.js';
import { addressOf, logLevels, runProcess, say } from './console.js';
import { DemoSeeder } from './demo/demo-seeder.js';
import { version } from './health/version.js';
import { tryListening } from './listen-address.js';
import { migrate, prepareFolder } from './open-database.js';
import type { Settings } from './settings/settings.js';

await runProcess(start);

async function start(settings: Settings): Promise<void> {
  await tryListening(settings);
  say(`Steelyard ${version}: opening the database ${settings.database}`);
  prepareFolder(settings);
  const app = await NestFactory.create<NestExpressApplication>(AppModule, {
    ...appOptions,
    logger: false,
    abortOnError: false,
  });
  configureApp(app);
  if ((await migrate(app)) > 0) say('The database is brought up to date.');
  await app.init();
  app.useLogger(logLevels);
  await seedDemo(app, settings);
  await app.listen(settings.port, settings.host);
  for (const signal of ['SIGTERM', 'SIGINT'] as const) process.once(signal, () => stop(app));
  await sayHowToEnter(app, addressOf(settings));
}

async function seedDemo(app: NestExpressApplication, { demo }: Settings): Promise<void> {
  const seeder = app.get(DemoSeeder);
  if (!demo || !(await seeder.isNeeded())) return;
  say('Seeding the demo into the empty database.');
  await seeder.seed();
}

async function sayHowToEnter(app: NestExpressApplication, address: string): Promise<void> {
  say(`Ready at ${address}`);
  const { firstVisit, demo } = await app.get(QueryBus).execute(new HowToEnter());
  if (firstVisit) say(`Create the administrator at ${address}/welcome/${app.get(FirstVisitCode).code}`);
  if (!demo) return;
  say(`Demo accounts, each with the password ${demo.password}`);
  for (const { email, name, part } of demo.accounts) say(`  ${email.padEnd(36)} ${name}: ${part}`);
}

async function stop(app: NestExpressApplication): Promise<void> {
  say('Stopping.');
  await app.close();
  process.exit(0);
}
