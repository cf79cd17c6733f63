import { setTimeout as pause } from 'node:timers/promises';

/** The most that the first load of a page may take, gzipped, all its scripts together. */
export const mostScript = 260_000;

/** How long a page must have asked for nothing to count as loaded, whatever it fetches when it is idle included. */
const quietMilliseconds = 2000;

/**
 * The scripts that a page fetches until it rests, without anything being touched: bytes on the wire by name, gzipped
 * as the server does it, without the headers of the answers.
 */
export async function scriptsOfFirstLoad(page, path) {
  const scripts = new Map();
  const answers = new Map();
  const session = await page.context().newCDPSession(page);
  await session.send('Network.enable');
  await session.send('Network.setExtraHTTPHeaders', { headers: { 'accept-encoding': 'gzip' } });
  session.on('Network.responseReceived', ({ requestId, response }) => {
    const name = new URL(response.url).pathname.split('/').at(-1);
    if (name.endsWith('.js')) answers.set(requestId, { name, headers: response.encodedDataLength });
  });
  session.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    const answer = answers.get(requestId);
    if (answer) scripts.set(answer.name, encodedDataLength - answer.headers);
  });
  await page.goto(path, { waitUntil: 'networkidle' });
  for (let seen = -1; seen !== scripts.size; await pause(quietMilliseconds)) seen = scripts.size;
  return scripts;
}

export const bytesOf = (scripts) => [...scripts.values()].reduce((sum, bytes) => sum + bytes, 0);
