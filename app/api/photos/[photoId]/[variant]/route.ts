import { z } from 'zod';
import { mayServePhoto } from '@/db/queries/photos';
import { VARIANTS } from '@/lib/photos/encode';
import { servePhoto } from '@/lib/photos/serve-photo';
import { notFound } from '@/lib/request/problem';
import { route } from '@/lib/request/route';

/** Signed out, foreign and missing are the same 404. */
export const GET = route(
  {
    access: 'anyone',
    params: z.object({ photoId: z.uuid(), variant: z.enum(VARIANTS) }),
    query: z.object({ r: z.coerce.number().pipe(z.int32().positive()).catch(0) }),
  },
  async ({ viewer, params: { photoId, variant }, query }) => {
    const audience = variant === 'master' ? 'owner' : 'readers';
    if (!viewer || !(await mayServePhoto(viewer, photoId, query.r, audience))) throw notFound();
    return servePhoto(photoId, query.r, variant);
  },
);
