import type { Hold } from '@steelyard/calc';
import type { Weighing } from './weighing';

/** Whether sizes, once held, are those that the options have now: to be tried out first, then saved or undone. */
export const entersSizes = (kind: Hold['kind'], { designSet: { hold }, options }: Weighing): boolean =>
  kind === 'sizes' && hold.kind !== 'sizes' && options.length > 0;
