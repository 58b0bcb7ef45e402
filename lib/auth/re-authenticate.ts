import 'server-only';
import { findPasswordHash } from '@/db/queries/own-account';
import type { Viewer } from '@/db/queries/viewer';
import { giveBack, takePoint } from '@/lib/limits/limit';
import type { FormState } from '@/lib/request/action';
import { waitSentence } from '@/lib/request/wait-sentence';
import { verifyPassword } from './password';

/** Whether it is really them: a session left open on a table is not enough to change an account. Null, or what to say. */
export async function refuseUnlessThemselves(viewer: Viewer, password: string): Promise<FormState | null> {
  const key = `account ${viewer.email}`;
  const wait = await takePoint('sign-in', [key]);
  if (wait) return { message: waitSentence(wait) };
  const isRight = await verifyPassword(await findPasswordHash(viewer), password);
  if (!isRight) return { fields: { current: ['This is not your password. Nothing was changed.'] } };
  await giveBack('sign-in', key);
  return null;
}
