import { readFileSync } from 'node:fs';
import type { Plugin } from 'vite';

const parts = /[\\/]zod[\\/]v4[\\/]core[\\/](json-schema-processors|to-json-schema)\.js$/;

/** Schemas judge here and are never written out: the part of zod that makes JSON Schema of them stays behind. */
export function zodWithoutJsonSchema(): Plugin {
  return {
    name: 'steelyard-zod-without-json-schema',
    apply: 'build',
    load(id) {
      if (!parts.test(id)) return undefined;
      const names = readFileSync(id, 'utf8').matchAll(/^export (?:const|function) (\w+)/gm);
      return [...names].map(([, name]) => `export const ${name} = () => ({});`).join('\n');
    },
  };
}
