import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { installRemedy, reasonToInstall } from '../lib/install.mjs';
import { requireNode } from '../lib/node-version.mjs';

describe('the reason to install', () => {
  let folder;
  const write = (name, packages) => writeFileSync(join(folder, name), JSON.stringify({ packages }));
  const install = (versions) => {
    for (const path of Object.keys(versions)) mkdirSync(join(folder, path), { recursive: true });
    const packages = Object.entries(versions).map(([path, version]) => [path, { version }]);
    write('node_modules/.package-lock.json', Object.fromEntries(packages));
  };

  beforeEach(() => {
    folder = mkdtempSync(join(tmpdir(), 'steelyard-install-'));
    write('package-lock.json', {
      '': { name: 'steelyard' },
      'packages/calc': { version: '0.1.0' },
      'node_modules/@steelyard/calc': { link: true },
      'node_modules/zod': { version: '4.6.7' },
      'node_modules/fsevents': { version: '2.3.3', optional: true },
      'packages/web/node_modules/zod': { version: '3.0.0' },
    });
    mkdirSync(join(folder, 'node_modules'));
  });
  afterEach(() => rmSync(folder, { recursive: true }));

  test('is a fresh clone while nothing is installed', () => {
    expect(reasonToInstall(folder)).toMatch(/nothing is installed yet/);
  });

  test('is none where everything is there but what other platforms need', () => {
    install({ 'node_modules/zod': '4.6.7', 'packages/web/node_modules/zod': '3.0.0' });
    expect(reasonToInstall(folder)).toBeNull();
  });

  test('is a version other than the lock file’s', () => {
    install({ 'node_modules/zod': '4.6.6', 'packages/web/node_modules/zod': '3.0.0' });
    expect(reasonToInstall(folder)).toMatch(/differ from package-lock\.json/);
  });

  test('is a package that a workspace lacks', () => {
    install({ 'node_modules/zod': '4.6.7' });
    expect(reasonToInstall(folder)).toMatch(/differ from package-lock\.json/);
  });

  test('is a package on record whose folder has been removed', () => {
    install({ 'node_modules/zod': '4.6.7', 'packages/web/node_modules/zod': '3.0.0' });
    rmSync(join(folder, 'packages'), { recursive: true });
    expect(reasonToInstall(folder)).toMatch(/differ from package-lock\.json/);
  });
});

describe('a failed installation names its remedy', () => {
  test.each([
    [
      'a missing compiler on Debian',
      'gyp ERR! stack Error: not found: make',
      'linux',
      /apt-get install -y build-essential python3/,
    ],
    ['a missing compiler on macOS', 'gyp ERR! find Python', 'darwin', /xcode-select --install/],
    ['a missing compiler on Windows', 'gyp ERR! find VS', 'win32', /Visual Studio Build Tools/],
    ['no network', 'npm error code EAI_AGAIN', 'linux', /network/],
    ['a full disk', 'npm error code ENOSPC', 'linux', /disk is full/],
    ['a folder that may not be written', 'npm error code EACCES', 'linux', /may not write here/],
    ['anything else', 'npm error something new', 'linux', /--verbose/],
  ])('for %s', (_, output, platform, remedy) => {
    expect(installRemedy(output, platform)).toMatch(remedy);
  });
});

describe('an old Node.js is refused', () => {
  test.each(['18.20.4', '20.18.9'])('such as %s', (version) => {
    expect(() => requireNode(version)).toThrow(/needs Node\.js 20\.19 or newer and this is/);
  });

  test.each(['20.19.0', '20.20.2', '22.0.0'])('unlike %s', (version) => {
    expect(() => requireNode(version)).not.toThrow();
  });
});
