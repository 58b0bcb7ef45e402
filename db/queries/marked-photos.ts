import 'server-only';
import { and, asc, inArray, sql } from 'drizzle-orm';
import { db } from '../client';
import { photos } from '../schema/photos';
import { rounds } from '../schema/rounds';
import type { Viewer } from './viewer';
import { photoIsKept, roundIds, roundVisibleTo } from './visible-to';

export interface MarkOnPhoto {
  id: string;
  kind: 'tight' | 'slack' | 'gap' | 'pooling' | 'tilt' | 'pin';
  severity: number;
  side: 'left' | 'right' | 'both';
  points: { x: number; y: number }[];
  note: string;
}

const marksOf = sql<MarkOnPhoto[]>`(
  select coalesce(json_agg(json_build_object('id', m.id, 'kind', m.kind, 'severity', m.severity, 'side', m.side, 'points', m.points, 'note', m.note) order by m.id), '[]')
  from marks m where m.photo_id = photos.id)`;

const landmarksOf = sql<{ landmark: string; x: number; y: number }[]>`(
  select coalesce(json_agg(json_build_object('landmark', l.landmark, 'x', l.x, 'y', l.y) order by l.landmark), '[]')
  from photo_landmarks l where l.photo_id = photos.id)`;

/** The photos of some rounds with everybody's marks on them and where the figure lies, for looking at. Rounds that the viewer may not see give none. */
export function listMarkedPhotos(viewer: Viewer, ids: string[]) {
  return db()
    .select({
      id: photos.id,
      roundId: photos.roundId,
      view: photos.view,
      isMirrored: photos.isMirrored,
      revision: photos.revision,
      widthPx: photos.widthPx,
      heightPx: photos.heightPx,
      marks: marksOf,
      landmarks: landmarksOf,
    })
    .from(photos)
    .where(
      and(
        inArray(photos.roundId, ids),
        inArray(photos.roundId, roundIds(and(roundVisibleTo(viewer), inArray(rounds.id, ids)))),
        photoIsKept,
      ),
    )
    .orderBy(asc(photos.id))
    .limit(120);
}
export type MarkedPhotoDto = Awaited<ReturnType<typeof listMarkedPhotos>>[number];
