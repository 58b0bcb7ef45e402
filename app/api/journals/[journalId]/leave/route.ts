import { z } from 'zod';
import { leaveJournal } from '@/db/queries/invitations';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

export const POST = route(
  { access: 'viewer', params: z.object({ journalId: z.uuid() }) },
  async ({ viewer, params }) => {
    orNotFound(await leaveJournal(viewer, params.journalId));
    return { left: true };
  },
);
