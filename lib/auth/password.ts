import 'server-only';
import { hash, verify } from '@node-rs/argon2';

// OWASP Password Storage Cheat Sheet (2024): Argon2id with 19 MiB, two passes, one lane.
const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export const hashPassword = (password: string): Promise<string> => hash(password, COST);

let decoy: Promise<string> | undefined;

/** Where there is no such account, a password is checked all the same, so that the answer takes as long. */
export async function verifyPassword(passwordHash: string | null, password: string): Promise<boolean> {
  decoy ??= hashPassword('no account has this password');
  const isRight = await verify(passwordHash ?? (await decoy), password);
  return passwordHash !== null && isRight;
}
