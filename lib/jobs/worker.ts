import PgBoss from 'pg-boss';
import { sweepSessionsAndTokens } from '@/db/queries/sweep';
import { env } from '@/lib/env';
import { log } from '@/lib/log';
import { sendMail } from '@/lib/mail/send-mail';
import { erasePhotoLeftovers } from '@/lib/photos/erase-leftovers';

/** The process beside the web: letters, and sweeping up. The queues' tables were made by the migration. */
const boss = new PgBoss({ connectionString: env().DATABASE_URL, migrate: false, max: 4 });
boss.on('error', (error) => log().error({ err: error }, 'the job queue failed'));

await boss.start();

await boss.work<{ mailId: string }>('send-mail', { pollingIntervalSeconds: 1 }, async ([job]) => {
  if (job) await sendMail(job.data.mailId);
});

await boss.schedule('sweep', '*/10 * * * *');
await boss.work('sweep', { pollingIntervalSeconds: 30 }, async () => {
  await sweepSessionsAndTokens();
  await erasePhotoLeftovers(new Date());
});

log().info('the worker is up');

for (const signal of ['SIGTERM', 'SIGINT'] as const) {
  process.on(signal, () => void boss.stop({ graceful: true, timeout: 6000 }).then(() => process.exit(0)));
}
