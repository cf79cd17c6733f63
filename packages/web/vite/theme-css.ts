import type { Plugin } from 'vite';
import { darkTheme, lightTheme } from '../src/app/theme/theme.ts';

const name = 'virtual:theme.css';

/** Both themes as a style sheet, so that no page carries the script that makes them. */
export function themeCss(): Plugin {
  return {
    name: 'steelyard-theme-css',
    resolveId: (source) => (source === name ? `\0${name}` : undefined),
    load: (id) =>
      id === `\0${name}`
        ? ruleOf('steelyard-light', lightTheme) + ruleOf('steelyard-dark', darkTheme)
        : undefined,
  };
}

const ruleOf = (className: string, theme: Record<string, string | number>): string =>
  `.${className}{${Object.entries(theme)
    .map(([token, value]) => `--${token}:${value};`)
    .join('')}}\n`;
