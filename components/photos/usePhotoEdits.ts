'use client';
import { useState } from 'react';
import { type Sent, sendJson } from '@/components/net/send';
import type { PhotoDto } from '@/db/queries/photos';

export type PhotoEdit = Partial<Pick<PhotoDto, 'view' | 'isMirrored'>>;

interface Options {
  onChanged: (photo: PhotoDto) => void;
  onRemoved: (photo: PhotoDto) => void;
}

const isPhoto = (value: unknown): value is PhotoDto =>
  typeof value === 'object' && value !== null && 'isMirrored' in value;

/** What a person says about a photo that is there: its view, the mirror, or that it goes; the last can be taken back. */
export function usePhotoEdits({ onChanged, onRemoved }: Options) {
  const [message, setMessage] = useState('');
  const [removed, setRemoved] = useState<PhotoDto | null>(null);

  /** True when it was done; else there is a sentence. */
  const settle = <T>(sent: Sent<T>): sent is { ok: true; value: T } => {
    setMessage(sent.ok ? '' : sent.problem.message);
    return sent.ok;
  };
  const edit = async (photo: PhotoDto, change: PhotoEdit) => {
    const body = { version: photo.version, ...change };
    const sent = await sendJson<PhotoDto>('PATCH', `/api/photos/${photo.id}`, body);
    if (settle(sent)) onChanged(sent.value);
    else if (sent.status === 409 && isPhoto(sent.problem.theirs)) onChanged(sent.problem.theirs);
  };
  const remove = async (photo: PhotoDto) => {
    if (!settle(await sendJson('DELETE', `/api/photos/${photo.id}`))) return;
    setRemoved(photo);
    onRemoved(photo);
  };
  const undo = async () => {
    if (!removed || !settle(await sendJson('POST', `/api/photos/${removed.id}/restore`))) return;
    setRemoved(null);
    // Putting it away and bringing it back each count as a version.
    onChanged({ ...removed, version: removed.version + 2 });
  };
  return { message, removed, edit, remove, undo };
}
