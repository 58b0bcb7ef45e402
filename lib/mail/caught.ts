import 'server-only';
import { readdir, readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { z } from 'zod';
import { env } from '@/lib/env';

const caughtSchema = z.object({
  id: z.string(),
  messageId: z.string(),
  to: z.array(z.string()),
  subject: z.string(),
  text: z.string(),
  receivedAt: z.string(),
});
export type CaughtMail = z.infer<typeof caughtSchema>;

const SHOWN_MAX = 50;

/** The letters that the local mail catcher took, newest first; null where there is no such thing. */
export async function listCaughtMail(): Promise<CaughtMail[] | null> {
  const { RUCKLE_LOCAL, MAIL_CATCHER_DIR } = env();
  if (!RUCKLE_LOCAL || !MAIL_CATCHER_DIR) return null;
  const names = (await readdir(MAIL_CATCHER_DIR)).filter((name) => /^\d+-[\w-]+\.json$/.test(name));
  const newest = names.sort().reverse().slice(0, SHOWN_MAX);
  return Promise.all(
    newest.map(async (name) =>
      caughtSchema.parse(JSON.parse(await readFile(join(MAIL_CATCHER_DIR, name), 'utf8'))),
    ),
  );
}
