'use client';
import { useActionState, useEffect, useState } from 'react';
import type { FormState } from '@/lib/request/action';
import { countDrafts, wipeDrafts } from '@/components/offline/drafts';
import { countUploads, wipeUploads } from '@/components/photos/upload-store';
import { Button } from '@/components/ui/Button';

interface Props {
  userId: string;
  action: (before: FormState, form: FormData) => Promise<FormState>;
}

/** Signing out takes what waits on this device with it, after saying how much that is. */
export function SignOut({ userId, action }: Props) {
  const [waiting, setWaiting] = useState(0);
  useEffect(() => {
    void Promise.all([countDrafts(userId), countUploads(userId)]).then(([drafts, uploads]) =>
      setWaiting(drafts + uploads),
    );
  }, [userId]);
  const [state, leave] = useActionState(action, {});
  // The form is the server's own, so that it works before any of this has loaded; nothing can wait on the device before that.
  const wipe = () => void Promise.all([wipeDrafts(userId), wipeUploads(userId)]);
  return (
    <form action={leave} onSubmit={wipe} className="grid gap-2">
      {waiting > 0 ? (
        <p className="border-l-4 border-basting pl-3">
          {waiting === 1 ? 'One thing waits' : `${waiting} things wait`} on this device and would be lost.
          Open its round with a connection first, and it is sent.
        </p>
      ) : null}
      {state.message ? <p role="alert">{state.message}</p> : null}
      <div>
        <Button type="submit">Sign out</Button>
      </div>
    </form>
  );
}
