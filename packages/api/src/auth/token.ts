import { createHash, randomBytes } from 'node:crypto';

export const newToken = () => randomBytes(32).toString('base64url');

/** What is stored of a token: whoever reads the database cannot enter with what is in it. */
export const digestOf = (token: string) => createHash('sha256').update(token).digest('hex');
