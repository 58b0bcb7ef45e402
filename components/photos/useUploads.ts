'use client';
import { useCallback, useEffect, useRef, useState } from 'react';
import type { PhotoDto } from '@/db/queries/photos';
import type { View } from '@/diagnosis/garments/schema';
import { type UploadLine, UploadSender } from './upload-sender';

interface Options {
  userId: string;
  roundId: string;
  onAdded: (photo: PhotoDto) => void;
}

/** The photos of a round on their way: kept on the device first, then sent until the server has them. */
export function useUploads({ userId, roundId, onAdded }: Options) {
  const [lines, setLines] = useState<UploadLine[]>([]);
  const sender = useRef<UploadSender | null>(null);
  const added = useRef(onAdded);
  useEffect(() => {
    added.current = onAdded;
  }, [onAdded]);
  useEffect(() => {
    const made = new UploadSender({
      userId,
      roundId,
      onLines: setLines,
      onAdded: (photo) => added.current(photo),
    });
    sender.current = made;
    made.resume();
    return () => {
      made.close();
      sender.current = null;
    };
  }, [userId, roundId]);
  const add = useCallback(
    async (files: File[], view: View, isMirrored: boolean) => sender.current?.add(files, view, isMirrored),
    [],
  );
  const cancel = useCallback(async (key: string) => sender.current?.cancel(key), []);
  return { lines, add, cancel };
}
