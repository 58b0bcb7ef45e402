import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

/** 32 random bytes that only their holder knows: a cookie or a link. */
export const makeSecret = (): string => randomBytes(32).toString('base64url');

/** What the database keeps of a secret. */
export const hashSecret = (secret: string): string => createHash('sha256').update(secret).digest('hex');
