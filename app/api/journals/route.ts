import { z } from 'zod';
import { journalSchema } from '@/components/journals/journal-schema';
import { createJournal, listJournals } from '@/db/queries/journals';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const GET = route(
  { access: 'viewer', query: z.object({ before: z.uuid().optional() }) },
  ({ viewer, query }) => listJournals(viewer, query.before),
);

export const POST = route(
  { access: 'viewer', body: journalSchema },
  async ({ viewer, body: { id, ...journal } }) => ({
    id: orNotFound(await createJournal(viewer, id, journal)),
  }),
);
