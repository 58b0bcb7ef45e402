import { z } from 'zod';
import { setPhotoRemoved } from '@/db/queries/photos';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ photoId: z.uuid() }) },
  async ({ viewer, params }) => {
    orNotFound(await setPhotoRemoved(viewer, params.photoId, false));
    return { restored: true };
  },
);
