import { spawnSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import process from 'node:process';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { root } from '../lib/commands.mjs';

const settings = ['biome.json', '.gitignore', 'package.json'];
const manifests = ['calc', 'api', 'web'].map((name) => `packages/${name}/package.json`);

const restricted = 'lint/style/noRestrictedImports';
const undeclared = 'lint/correctness/noUndeclaredDependencies';
const cycle = 'lint/suspicious/noImportCycles';
const restrictedGlobal = 'lint/style/noRestrictedGlobals';

/** Where a fault is planted, what is imported there, and the rule that must object. */
const faults = [
  [
    'calc imports the api',
    'packages/calc/src/designs/faulty.ts',
    '@steelyard/api/contract/studies',
    restricted,
  ],
  [
    'calc reaches into the api by path',
    'packages/calc/src/faulty.ts',
    '../../api/src/contract/studies.js',
    restricted,
  ],
  ['calc reaches into web by path', 'packages/calc/src/faulty.ts', '../../web/src/main', restricted],
  ['calc imports a Node.js built-in', 'packages/calc/src/numeric/faulty.ts', 'node:fs', restricted],
  ['calc imports a built-in by its old name', 'packages/calc/src/numeric/faulty.ts', 'fs', restricted],
  ['calc imports a package other than zod', 'packages/calc/src/faulty.ts', 'jstat', restricted],
  [
    'the command line of calc imports the api',
    'packages/calc/src/cli/faulty.ts',
    '@steelyard/api/contract/access',
    restricted,
  ],
  ['a test of calc imports web', 'packages/calc/test/faulty.test.ts', '@steelyard/web', restricted],
  ['the api imports web', 'packages/api/src/studies/faulty.ts', '@steelyard/web', restricted],
  [
    'the api reaches into web by path',
    'packages/api/src/studies/faulty.ts',
    '../../../web/src/app/paths',
    restricted,
  ],
  [
    'the api reaches into calc',
    'packages/api/src/studies/faulty.ts',
    '@steelyard/calc/dist/designs/registry.js',
    restricted,
  ],
  [
    'the api imports what only its tests declare',
    'packages/api/src/studies/faulty.ts',
    'supertest',
    undeclared,
  ],
  ['the api imports what it does not declare', 'packages/api/src/studies/faulty.ts', 'react', undeclared],
  ['the contract imports Nest', 'packages/api/src/contract/faulty.ts', '@nestjs/common', restricted],
  [
    'the contract imports a module of the api',
    'packages/api/src/contract/faulty.ts',
    '../studies/study.entity.js',
    restricted,
  ],
  [
    'the contract imports a Node.js built-in',
    'packages/api/src/contract/faulty.ts',
    'node:crypto',
    restricted,
  ],
  [
    'web imports the api beyond its contract',
    'packages/web/src/app/faulty.ts',
    '@steelyard/api/studies/study.view',
    restricted,
  ],
  ['web imports the whole api', 'packages/web/src/app/faulty.ts', '@steelyard/api', restricted],
  [
    'web reaches into the api by path',
    'packages/web/src/app/faulty.ts',
    '../../../api/src/contract/access',
    restricted,
  ],
  ['a test of web reaches into calc', 'packages/web/test/faulty.test.ts', '../../calc/src/index', restricted],
  [
    'web imports a Node.js built-in',
    'packages/web/src/shared/faulty.ts',
    'node:path',
    'lint/correctness/noNodejsModules',
  ],
  [
    'shared imports a feature',
    'packages/web/src/shared/ui/faulty.tsx',
    '../../features/weigh/model/rows',
    restricted,
  ],
  ['shared imports the app', 'packages/web/src/shared/faulty.ts', '../app/paths', restricted],
  [
    'shared imports the api beyond its contract',
    'packages/web/src/shared/faulty.ts',
    '@steelyard/api',
    restricted,
  ],
  ['a feature imports the app', 'packages/web/src/features/weigh/faulty.ts', '../../app/pages', restricted],
  [
    'a feature imports the api beyond its contract',
    'packages/web/src/features/weigh/faulty.ts',
    '@steelyard/api',
    restricted,
  ],
  ['a scene imports React', 'packages/web/src/charts/scene/faulty.ts', 'react', restricted],
  [
    'drawing imports Fluent',
    'packages/web/src/charts/draw/faulty.ts',
    '@fluentui/react-components',
    restricted,
  ],
  [
    'a scene imports the canvas component',
    'packages/web/src/charts/scene/faulty.ts',
    '../canvas-chart',
    restricted,
  ],
  [
    'a scene imports a feature',
    'packages/web/src/charts/scene/faulty.ts',
    '../../features/weigh/model/rows',
    restricted,
  ],
  [
    'the canvas component imports a feature',
    'packages/web/src/charts/canvas-chart.tsx',
    '../features/weigh/model/rows',
    restricted,
  ],
  ['a script that installs imports a package', 'scripts/faulty.mjs', 'vite', restricted],
  ['a part of it imports a package', 'scripts/lib/faulty.mjs', 'vite', restricted],
  ['a script imports what nobody declares', 'scripts/screenshots.mjs', 'lodash', undeclared],
];

const innocents = [
  ['packages/calc/src/designs/innocent.ts', ['zod', './family.js', '../numeric/root.js']],
  ['packages/calc/src/cli/innocent.ts', ['node:fs', '../index.js']],
  ['packages/calc/test/innocent.test.ts', ['node:fs', 'vitest', 'jstat', '../src/index.js']],
  [
    'packages/api/src/studies/innocent.ts',
    ['@nestjs/common', 'node:crypto', '@steelyard/calc', '../contract/studies.js'],
  ],
  ['packages/api/src/contract/innocent.ts', ['zod', '@steelyard/calc', './access.js']],
  ['packages/web/src/app/innocent.ts', ['react', '../features/weigh/weigh-page', '../shared/format']],
  [
    'packages/web/src/features/weigh/innocent.ts',
    [
      '@steelyard/api/contract/studies',
      '@steelyard/calc',
      '../../shared/format',
      '../../charts/canvas-chart',
    ],
  ],
  [
    'packages/web/src/shared/innocent.tsx',
    ['react', '@fluentui/react-components', '@steelyard/api/contract/problem', './app-bar'],
  ],
  ['packages/web/src/charts/scene/innocent.ts', ['./marks', '../../shared/format']],
  ['packages/web/src/charts/innocent.tsx', ['./scene/marks']],
  ['scripts/lib/innocent.mjs', ['node:fs', 'node:timers/promises', './progress.mjs']],
];

let scratch;
let diagnostics;

function plant(path, source) {
  const file = join(scratch, path);
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, source);
}

const importing = (names) => names.map((name) => `import '${name}';\n`).join('');
const fault = (path, index) =>
  path.replace(/[^/]+$/, (name) => (name.startsWith('faulty') ? `${index}-${name}` : name));

function found(path) {
  return diagnostics.filter(({ location }) => location.path === path).map(({ category }) => category);
}

beforeAll(() => {
  scratch = mkdtempSync(join(tmpdir(), 'steelyard-rules-'));
  for (const name of [...settings, ...manifests]) cpSync(join(root, name), join(scratch, name));
  for (const [index, [, path, name]] of faults.entries()) plant(fault(path, index), importing([name]));
  for (const [path, names] of innocents) plant(path, importing(names));
  plant('packages/calc/src/cycle/one.ts', "import { two } from './two.js';\nexport const one = () => two;\n");
  plant('packages/calc/src/cycle/two.ts', "import { one } from './one.js';\nexport const two = () => one;\n");
  plant('packages/calc/src/clock.ts', 'export const today = () => Date.now();\n');
  const biome = join(root, 'node_modules/@biomejs/biome/bin/biome');
  const { stdout } = spawnSync(
    process.execPath,
    [biome, 'lint', '--reporter=json', '--max-diagnostics=none', '.'],
    {
      cwd: scratch,
      encoding: 'utf8',
    },
  );
  ({ diagnostics } = JSON.parse(stdout));
}, 60_000);

afterAll(() => rmSync(scratch, { recursive: true, force: true }));

describe('a planted fault is refused', () => {
  test.each(faults.map(([title, path, , rule], index) => [title, fault(path, index), rule]))(
    'when %s',
    (_, path, rule) => {
      expect(found(path)).toContain(rule);
    },
  );

  test('when two files import each other', () => {
    expect(found('packages/calc/src/cycle/one.ts')).toContain(cycle);
    expect(found('packages/calc/src/cycle/two.ts')).toContain(cycle);
  });

  test('when calc reads the clock', () => {
    expect(found('packages/calc/src/clock.ts')).toContain(restrictedGlobal);
  });
});

describe('an innocent file passes', () => {
  test.each(innocents)('%s', (path) => {
    expect(found(path)).toEqual([]);
  });
});
