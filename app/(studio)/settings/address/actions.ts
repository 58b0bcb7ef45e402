'use server';
import { changeEmailSchema } from '@/components/account/account-schema';
import { askForEmailChange } from '@/db/queries/own-account';
import { refuseUnlessThemselves } from '@/lib/auth/re-authenticate';
import { requireViewer } from '@/lib/auth/viewer';
import { takeMailPoint } from '@/lib/limits/limit';
import { formAction } from '@/lib/request/action';
import { clientAddress } from '@/lib/request/client-address';
import { waitSentence } from '@/lib/request/wait-sentence';

export const askForAddress = formAction(changeEmailSchema, async ({ current, email }, request) => {
  const viewer = await requireViewer();
  const refused = await refuseUnlessThemselves(viewer, current);
  if (refused) return refused;
  const wait = await takeMailPoint(email, clientAddress(request));
  if (wait) return { message: waitSentence(wait) };
  await askForEmailChange(viewer, email);
  return { isDone: true };
});
