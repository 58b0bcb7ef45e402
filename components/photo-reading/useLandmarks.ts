'use client';
import { useCallback, useState } from 'react';
import useSWR from 'swr';
import { fetchJson, sendJson } from '@/components/net/send';
import type { LandmarkInput, LandmarksDto } from '@/db/queries/landmarks';

const NONE: LandmarkInput[] = [];

const isSet = (value: unknown): value is LandmarksDto =>
  typeof value === 'object' && value !== null && 'landmarks' in value && 'version' in value;

/** Where the figure lies on one photo, and keeping it there. */
export function useLandmarks(photo: { id: string; revision: number }) {
  const url = `/api/photos/${photo.id}/landmarks`;
  const { data, mutate } = useSWR<LandmarksDto>(url, fetchJson);
  const [message, setMessage] = useState('');
  /** True when it is kept; else a sentence says why, and what was moved elsewhere meanwhile is shown. */
  const save = useCallback(
    async (landmarks: LandmarkInput[]): Promise<boolean> => {
      const body = { revision: photo.revision, seen: data?.version ?? 0, landmarks };
      const sent = await sendJson<LandmarksDto>('PUT', url, body);
      setMessage(sent.ok ? '' : sent.problem.message);
      if (sent.ok) await mutate(sent.value, { revalidate: false });
      else if (isSet(sent.problem.theirs)) await mutate(sent.problem.theirs, { revalidate: false });
      return sent.ok;
    },
    [url, photo.revision, data?.version, mutate],
  );
  return { landmarks: data?.landmarks ?? NONE, isLoaded: data !== undefined, message, save };
}
