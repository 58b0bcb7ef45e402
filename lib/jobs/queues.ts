import type PgBoss from 'pg-boss';

type QueueSpec = PgBoss.Queue & { name: string };

/** Every kind of work that outlives its request. Payloads hold ids only. */
export const QUEUES: QueueSpec[] = [
  {
    name: 'send-mail',
    policy: 'standard',
    retryLimit: 40,
    retryDelay: 5,
    retryBackoff: true,
    expireInSeconds: 120,
  },
  { name: 'sweep', policy: 'singleton', retryLimit: 2, retryDelay: 30, expireInSeconds: 600 },
];
