import { z } from 'zod';
import { uploadQuerySchema } from '@/components/photos/photo-schema';
import { findPhotos } from '@/db/queries/photos';
import { receivePhoto } from '@/lib/photos/receive-photo';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

const params = z.object({ roundId: z.uuid() });

export const GET = route({ access: 'viewer', params }, async ({ viewer, params }) =>
  orNotFound(await findPhotos(viewer, params.roundId)),
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
