'use server';
import { emailOnlySchema } from '@/components/account/account-schema';
import { askForReset } from '@/db/queries/accounts';
import { takeMailPoint } from '@/lib/limits/limit';
import { formAction } from '@/lib/request/action';
import { clientAddress } from '@/lib/request/client-address';
import { inEvenTime } from '@/lib/request/even-time';
import { waitSentence } from '@/lib/request/wait-sentence';

const EVEN_MS = 150;

export const sendReset = formAction(emailOnlySchema, async ({ email }, request) => {
  const wait = await takeMailPoint(email, clientAddress(request));
  if (wait) return { message: waitSentence(wait) };
  await inEvenTime(EVEN_MS, () => askForReset(email));
  return { isDone: true };
});
