import { execFileSync } from 'node:child_process';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Writers } from './support/writers.js';

const servers = 2;
const rounds = process.env.CI ? 25 : 3;

describe('A server killed while people write', () => {
  let folder: string;
  let writers: Writers[] = [];

  beforeAll(async () => {
    execFileSync('npm', ['run', 'build'], { cwd: join(__dirname, '..') });
    folder = await mkdtemp(join(tmpdir(), 'steelyard-killed-'));
    const folders = Array.from({ length: servers }, (_, place) => join(folder, String(place)));
    writers = await Promise.all(folders.map((each) => Writers.start(each)));
  }, 120_000);

  afterAll(async () => {
    await Promise.all(writers.map((each) => each.stop()));
    await rm(folder, { recursive: true });
  });

  test(`has every acknowledged write when it is back, ${servers} times ${rounds} times`, async () => {
    const again = async (each: Writers) => {
      for (let round = 0; round < rounds; round += 1) await each.round();
      await each.expectAll(each.acknowledged);
    };
    await Promise.all(writers.map(again));
  }, 300_000);
});
