import { readFileSync } from 'node:fs';
import type { Plugin } from 'vite';

const tokens = /[\\/]@fluentui[\\/]tokens[\\/]lib[\\/]tokens\.js$/;
const mirroring = /[\\/]rtl-css-js[\\/]dist[\\/]esm[\\/]core\.js$/;

/** Fluent without the list of its tokens, which their names say already, and without mirroring: we write left to right. */
export function lighterFluent(): Plugin {
  return {
    name: 'steelyard-lighter-fluent',
    apply: 'build',
    load(id) {
      if (tokens.test(id)) return tokensByName(readFileSync(id, 'utf8'));
      if (mirroring.test(id)) return leftToRight;
      return undefined;
    },
  };
}

/** The token of any name is the custom property of that name; only those with a fallback are listed. */
function tokensByName(source: string): string {
  const listed = [...source.matchAll(/(\w+): '(var\([^']+\))'/g)].filter(
    ([, name, value]) => value !== `var(--${name})`,
  );
  const own = Object.fromEntries(listed.map(([, name, value]) => [name, value]));
  return `export const tokens = new Proxy(${JSON.stringify(own)}, {
    get: (listed, name) => listed[name] ?? \`var(--\${name})\`,
  });`;
}

const leftToRight = `
  export const convert = (rules) => rules;
  export const convertProperty = (key, value) => ({ key, value });
`;
