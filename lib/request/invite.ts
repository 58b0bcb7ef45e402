import 'server-only';
import { invite, type InviteInput, type ShareTarget } from '@/db/queries/sharing';
import type { Viewer } from '@/db/queries/viewer';
import { takePoint } from '@/lib/limits/limit';
import { Problem } from './problem';
import { waitSentence } from './wait-sentence';
import { orNotFound } from './written';

/** Few letters an hour to one mailbox, whoever it belongs to, and not many by one person. */
export async function takeInvitePoint(viewer: Viewer, email: string): Promise<void> {
  const wait =
    (await takePoint('invite', [`user ${viewer.userId}`])) ?? (await takePoint('mail', [`invited ${email}`]));
  if (wait) throw new Problem(429, 'too-often', waitSentence(wait), { retryAfterS: wait });
}

const REFUSED = {
  'no-consent':
    'The person this is sewn for has not agreed to be shown to anyone. Ask them first, then write it down with them.',
  oneself: 'This is your own address.',
} as const;

export async function inviteTo(viewer: Viewer, target: ShareTarget, input: InviteInput) {
  await takeInvitePoint(viewer, input.email);
  const ending = orNotFound(await invite(viewer, target, input));
  if (ending !== 'invited') throw new Problem(422, ending, REFUSED[ending]);
  return { invited: true };
}
