import { z } from 'zod';
import { marksSaveSchema } from '@/components/marks/mark-schema';
import { findOwnMarks, saveMarks } from '@/db/queries/marks';
import { notFound, Problem } from '@/lib/request/problem';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

const params = z.object({ photoId: z.uuid() });

export const GET = route({ access: 'viewer', params }, async ({ viewer, params }) =>
  orNotFound(await findOwnMarks(viewer, params.photoId)),
);

export const POST = route(
  { access: 'viewer', params, body: marksSaveSchema },
  async ({ viewer, params, body }) => {
    const saving = await saveMarks(viewer, params.photoId, body);
    if (saving.kind === 'done') return saving.answer;
    if (saving.kind === 'missing') throw notFound();
    if (saving.kind === 'too-many') throw new Problem(422, 'too-many', 'A photo holds at most 500 marks.');
    throw new Problem(
      409,
      'other-revision',
      'The photo was changed meanwhile. Your marks are kept here; open it again.',
      {
        revision: saving.revision,
      },
    );
  },
);
