import process from 'node:process';
import { Remedy } from './progress.mjs';

export const oldestNode = [20, 19];

export function requireNode(version = process.versions.node) {
  const [major, minor] = version.split('.').map(Number);
  if (major > oldestNode[0] || (major === oldestNode[0] && minor >= oldestNode[1])) return;
  throw new Remedy(
    `Steelyard needs Node.js ${oldestNode.join('.')} or newer and this is ${version}. Install a current Node.js from https://nodejs.org, then run the same command again.`,
  );
}
