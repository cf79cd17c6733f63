import { Foundation } from './20251201-foundation.js';
import { Decisions } from './20251208-decisions.js';

/** In the order in which they were written; a name once given stays. */
export const migrations = [
  { name: '20251201-foundation', class: Foundation },
  { name: '20251208-decisions', class: Decisions },
];
