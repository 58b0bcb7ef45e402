'use client';
import useSWR from 'swr';
import { fetchJson } from '@/components/net/send';
import type { PhotoDto } from '@/db/queries/photos';
import type { View } from '@/diagnosis/garments/schema';
import { CameraPanel } from './CameraPanel';

interface Props {
  view: View;
  /** The round before this one, where there is one. */
  previousRoundId: string | null;
  onTake: (file: File) => void;
  onClose: () => void;
}

/** The camera with the same view of the round before as a ghost. */
export function Camera({ view, previousRoundId, onTake, onClose }: Props) {
  const url = previousRoundId ? `/api/rounds/${previousRoundId}/photos` : null;
  const { data: photos = [] } = useSWR<PhotoDto[]>(url, fetchJson);
  const ghost = photos.find((photo) => photo.view === view) ?? null;
  return <CameraPanel ghost={ghost} onTake={onTake} onClose={onClose} />;
}
