'use client';
import { useCallback, useEffect, useRef, useState } from 'react';
import type { PhotoDto } from '@/db/queries/photos';
import type { View } from '@/diagnosis/garments/schema';
import { makeUploadKey, preparePhoto } from './prepare-photo';
import { sendUpload } from './send-upload';
import { dropUpload, keepUpload, listUploads, type WaitingUpload } from './upload-store';

export interface UploadLine {
  key: string;
  name: string;
  state: 'preparing' | 'waiting' | 'sending' | 'refused';
  part: number;
  message: string;
}

interface Options {
  userId: string;
  roundId: string;
  onAdded: (photo: PhotoDto) => void;
}

/** One tab sends at a time; where the browser has no locks, the upload key still makes one photo of two sendings. */
const alone = (name: string, work: () => Promise<void>): Promise<void> =>
  navigator.locks
    ? navigator.locks.request(name, { ifAvailable: true }, (lock) => (lock ? work() : undefined))
    : work();

/** Photos on their way: kept on the device first, then sent one after another, tried again until the server has them. */
export function useUploads({ userId, roundId, onAdded }: Options) {
  const [lines, setLines] = useState<UploadLine[]>([]);
  const waiting = useRef<WaitingUpload[]>([]);
  const sending = useRef<{ key: string; abort: AbortController } | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const pumpRef = useRef<() => void>(() => {});

  const edit = useCallback((key: string, change: Partial<UploadLine>) => {
    setLines((now) => now.map((line) => (line.key === key ? { ...line, ...change } : line)));
  }, []);
  const forget = useCallback(
    async (key: string) => {
      waiting.current = waiting.current.filter((one) => one.key !== key);
      await dropUpload(userId, key);
    },
    [userId],
  );

  const sendNext = useCallback(async () => {
    for (let next = waiting.current[0]; next; next = waiting.current[0]) {
      const { key } = next;
      const abort = new AbortController();
      sending.current = { key, abort };
      edit(key, { state: 'sending', message: '' });
      const end = await sendUpload(next, (part) => edit(key, { part }), abort.signal);
      sending.current = null;
      if (end.kind === 'again') {
        edit(key, { state: 'waiting', part: 0, message: end.message });
        timer.current = setTimeout(() => pumpRef.current(), end.afterMs);
        return;
      }
      await forget(key);
      if (end.kind === 'added') {
        setLines((now) => now.filter((line) => line.key !== key));
        onAdded(end.photo);
      } else if (end.kind === 'refused') edit(key, { state: 'refused', message: end.message });
      else setLines((now) => now.filter((line) => line.key !== key));
    }
  }, [edit, forget, onAdded]);

  useEffect(() => {
    pumpRef.current = () => {
      clearTimeout(timer.current);
      if (!sending.current) void alone(`ruckle-uploads-${userId}-${roundId}`, sendNext);
    };
  }, [sendNext, userId, roundId]);

  useEffect(() => {
    void listUploads(userId, roundId).then((kept) => {
      waiting.current = kept;
      setLines(kept.map(({ key, name }) => ({ key, name, state: 'waiting', part: 0, message: '' })));
      if (kept.length > 0) pumpRef.current();
    });
    const online = () => pumpRef.current();
    window.addEventListener('online', online);
    return () => {
      window.removeEventListener('online', online);
      clearTimeout(timer.current);
      sending.current?.abort.abort();
    };
  }, [userId, roundId]);

  const add = useCallback(
    async (files: File[], view: View, isMirrored: boolean) => {
      const made = files.map((file) => ({ file, key: makeUploadKey() }));
      setLines((now) => [
        ...now,
        ...made.map(({ file, key }) => ({
          key,
          name: file.name,
          state: 'preparing' as const,
          part: 0,
          message: '',
        })),
      ]);
      for (const { file, key } of made) {
        const upload = { key, roundId, name: file.name, view, isMirrored, file: await preparePhoto(file) };
        await keepUpload(userId, upload);
        waiting.current = [...waiting.current, upload];
        edit(key, { state: 'waiting' });
        pumpRef.current();
      }
    },
    [edit, roundId, userId],
  );

  const cancel = useCallback(
    async (key: string) => {
      if (sending.current?.key === key) return sending.current.abort.abort();
      await forget(key);
      setLines((now) => now.filter((line) => line.key !== key));
    },
    [forget],
  );

  return { lines, add, cancel };
}
