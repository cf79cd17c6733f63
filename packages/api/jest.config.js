import { mkdirSync } from 'node:fs';

// Jest writes its report into a folder only where there is one.
mkdirSync(new URL('reports', import.meta.url), { recursive: true });

/** @type {import('jest').Config} */
export default {
  testEnvironment: 'node',
  roots: ['<rootDir>/test'],
  transform: { '\\.ts$': '@swc/jest' },
  moduleNameMapper: {
    '^@steelyard/calc$': '<rootDir>/../calc/src/index.ts',
    '^(\\.{1,2}/.*)\\.js$': '$1',
  },
};
