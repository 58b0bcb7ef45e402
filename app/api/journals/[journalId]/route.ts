import { z } from 'zod';
import { journalEditSchema } from '@/components/journals/journal-schema';
import { removeJournal, updateJournal } from '@/db/queries/journals';
import { route } from '@/lib/request/route';
import { orNotFound, unwrap } from '@/lib/request/written';

const params = z.object({ journalId: z.uuid() });

export const PATCH = route(
  { access: 'viewer', params, body: journalEditSchema },
  async ({ viewer, params, body: { version, ...edit } }) =>
    unwrap(await updateJournal(viewer, params.journalId, version, edit)),
);

export const DELETE = route({ access: 'viewer', params }, async ({ viewer, params }) => {
  orNotFound(await removeJournal(viewer, params.journalId));
  return { removed: true };
});
