'use server';
import { emailOnlySchema } from '@/components/account/account-schema';
import { askForReset } from '@/db/queries/accounts';
import { takePoint } from '@/lib/limits/limit';
import { formAction } from '@/lib/request/action';
import { waitSentence } from '@/lib/request/wait-sentence';

export const sendReset = formAction(emailOnlySchema, async ({ email }) => {
  const wait = await takePoint('mail', [`account ${email}`]);
  if (wait) return { message: waitSentence(wait) };
  await askForReset(email);
  return { isDone: true };
});
