import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { findChromium } from '../lib/chromium.mjs';

describe('the browser for the checks', () => {
  let empty;
  let folder;
  let chrome;
  beforeAll(() => {
    empty = mkdtempSync(join(tmpdir(), 'steelyard-none-'));
    folder = mkdtempSync(join(tmpdir(), 'steelyard-chrome-'));
    chrome = join(folder, 'google-chrome');
    writeFileSync(chrome, '');
  });
  afterAll(() => {
    for (const each of [empty, folder]) rmSync(each, { recursive: true });
  });

  test('is looked for along the path', () => {
    expect(findChromium({ PATH: [empty, folder].join(delimiter) })).toBe(chrome);
  });

  test('is the one that CHROMIUM_PATH names', () => {
    expect(findChromium({ CHROMIUM_PATH: empty, PATH: folder })).toBe(empty);
  });

  test('is none where CHROMIUM_PATH names what is not there, so that a mistyped path shows', () => {
    expect(findChromium({ CHROMIUM_PATH: join(folder, 'nowhere'), PATH: folder })).toBeNull();
  });
});
