import { once } from 'node:events';
import { createServer } from 'node:net';
import type { Settings } from './settings/settings.js';

/** Fails where the server could not listen, before the database of another server is touched. */
export async function tryListening({ host, port }: Settings): Promise<void> {
  const probe = createServer().listen(port, host);
  await once(probe, 'listening');
  probe.close();
  await once(probe, 'close');
}
