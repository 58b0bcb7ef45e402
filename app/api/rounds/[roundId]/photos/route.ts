import { z } from 'zod';
import { uploadQuerySchema } from '@/components/photos/photo-schema';
import { listPhotos } from '@/db/queries/photos';
import { receivePhoto } from '@/lib/photos/receive-photo';
import { route } from '@/lib/request/route';

const params = z.object({ roundId: z.uuid() });

export const GET = route({ access: 'viewer', params }, ({ viewer, params }) =>
  listPhotos(viewer, params.roundId),
);

export const POST = route(
  { access: 'viewer', params, query: uploadQuerySchema },
  ({ viewer, params, query, request }) =>
    receivePhoto(viewer, params.roundId, request, {
      uploadKey: query.key,
      view: query.view,
      isMirrored: query.mirrored === '1',
    }),
);
