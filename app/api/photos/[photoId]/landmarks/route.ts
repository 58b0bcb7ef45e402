import { z } from 'zod';
import { landmarksSaveSchema } from '@/components/photo-reading/landmark-schema';
import { findLandmarks, saveLandmarks } from '@/db/queries/landmarks';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ photoId: z.uuid() });

export const GET = route({ access: 'viewer', params }, async ({ viewer, params }) =>
  orNotFound(await findLandmarks(viewer, params.photoId)),
);

export const PUT = route(
  { access: 'viewer', params, body: landmarksSaveSchema },
  async ({ viewer, params, body }) => unwrap(await saveLandmarks(viewer, params.photoId, body)),
);
