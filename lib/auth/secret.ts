import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

/** A secret of 160 random bits, fit for a cookie or a link. */
export const newSecret = (): string => randomBytes(20).toString('base64url');

/** What is stored in place of a secret: a copy of the database then opens nothing. */
export const digest = (secret: string): string => createHash('sha256').update(secret).digest('hex');
