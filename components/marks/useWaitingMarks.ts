'use client';
import { useEffect, useState } from 'react';
import { listDrafts } from '@/components/offline/drafts';
import { ifNobodyHolds } from './photo-lock';
import { MarkKeeper, WAITING, type WaitingMarks } from './mark-keeper';

const RETRY_MS = 30_000;

const waitingOn = async (userId: string, photoId: string) =>
  (await listDrafts<WaitingMarks>(userId, WAITING)).filter(({ rest }) => rest !== photoId);

/** Sends what waits on photos that are not on the table. What is contested there waits until its photo is opened. */
async function sendWaiting(userId: string, photoId: string): Promise<number> {
  for (const { rest: id, draft } of await waitingOn(userId, photoId)) {
    await ifNobodyHolds(id, async () => {
      const keeper = new MarkKeeper({ userId, photo: { id, revision: draft.revision } });
      await keeper.load();
      await keeper.flush();
    });
  }
  const left = await waitingOn(userId, photoId);
  return left.reduce((sum, { draft }) => sum + draft.count, 0);
}

/** How many marks of other photos are on this device only; they are sent as soon as they can be. */
export function useWaitingMarks(userId: string, photoId: string): number {
  const [count, setCount] = useState(0);
  useEffect(() => {
    let [isGone, isSending] = [false, false];
    const send = async () => {
      if (isSending) return;
      isSending = true;
      const left = await sendWaiting(userId, photoId);
      isSending = false;
      if (!isGone) setCount(left);
    };
    void send();
    const online = () => void send();
    const retry = setInterval(online, RETRY_MS);
    window.addEventListener('online', online);
    return () => {
      isGone = true;
      clearInterval(retry);
      window.removeEventListener('online', online);
    };
  }, [userId, photoId]);
  return count;
}
