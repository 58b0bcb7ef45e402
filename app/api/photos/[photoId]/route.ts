import { z } from 'zod';
import { photoEditSchema } from '@/components/photos/photo-schema';
import { setPhotoRemoved, updatePhoto } from '@/db/queries/photos';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ photoId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: photoEditSchema },
  async ({ viewer, params, body: { version, ...edit } }) =>
    unwrap(await updatePhoto(viewer, params.photoId, version, edit)),
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await setPhotoRemoved(viewer, params.photoId, true));
  return { removed: true };
});
