import { type ComponentType, lazy } from 'react';

/** A component whose script comes when it is first shown, or before, when it is sent for. */
export function lazily<Props>(load: () => Promise<ComponentType<Props>>) {
  return Object.assign(
    lazy(async () => ({ default: await load() })),
    // What fails fails again where it is shown, and is told there.
    { sendFor: () => void load().catch(() => undefined) },
  );
}
