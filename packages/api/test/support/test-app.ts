import { EntityManager } from '@mikro-orm/sqlite';
import { CommandBus } from '@nestjs/cqrs';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { Test } from '@nestjs/testing';
import request from 'supertest';
import { AppModule } from '../../src/app.module.js';
import { Clock } from '../../src/common/clock.js';
import { appOptions, configureApp } from '../../src/configure-app.js';
import { DemoSeeder } from '../../src/demo/demo-seeder.js';
import { demoPassword } from '../../src/demo/people.js';
import { migrate } from '../../src/open-database.js';
import { appSettings, readSettings, type Settings } from '../../src/settings/settings.js';
import { TestClock } from './test-clock.js';

interface Wishes {
  settings?: Partial<Settings>;
  /** Fill it with the demo. */
  seeded?: boolean;
  /** Where the web application's files are; by default where its build puts them. */
  webBuild?: string;
}

/** The real application on a database of its own, in memory unless the settings say otherwise. */
export class TestApp {
  readonly commands: CommandBus;
  readonly em: EntityManager;

  private constructor(
    readonly nest: NestExpressApplication,
    readonly clock: TestClock,
  ) {
    this.commands = nest.get(CommandBus);
    this.em = nest.get(EntityManager);
  }

  static async start({ settings, seeded = false, webBuild }: Wishes = {}): Promise<TestApp> {
    const clock = new TestClock();
    const testing = await Test.createTestingModule({ imports: [AppModule] })
      .overrideProvider(appSettings.KEY)
      .useValue({ ...readSettings({}), database: ':memory:', ...settings })
      .overrideProvider(Clock)
      .useValue(clock)
      .compile();
    const nest = testing.createNestApplication<NestExpressApplication>({ ...appOptions, logger: false });
    configureApp(nest, webBuild);
    await migrate(nest);
    await nest.init();
    if (seeded) await nest.get(DemoSeeder).seed();
    return new TestApp(nest, clock);
  }

  /** A request of somebody who has not signed in, or of the holder of a cookie. */
  request(method: 'get' | 'post' | 'delete' | 'put' | 'patch' | 'head', path: string, cookie?: string) {
    const asked = request(this.nest.getHttpServer())[method](path);
    return cookie ? asked.set('Cookie', cookie) : asked;
  }

  get(path: string, cookie?: string) {
    return this.request('get', path, cookie);
  }

  /** Signs in and answers with the cookie. */
  async signIn(email: string, password = demoPassword): Promise<string> {
    const response = await this.request('post', '/api/session').send({ email, password });
    expect(response.status).toBe(201);
    return cookieOf(response);
  }

  close(): Promise<void> {
    return this.nest.close();
  }
}

/** The cookie that a response sets, as a browser sends it back. */
export function cookieOf(response: request.Response): string {
  return setCookieOf(response).split(';')[0] ?? '';
}

export function setCookieOf({ headers }: request.Response): string {
  const [cookie = ''] = (headers['set-cookie'] ?? []) as unknown as string[];
  return cookie;
}
