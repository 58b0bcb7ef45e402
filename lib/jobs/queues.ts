import type PgBoss from 'pg-boss';

type QueueSpec = PgBoss.Queue & { name: string };

/**
 * Every kind of work that outlives its request. Payloads hold ids only. A letter is tried twice a minute for nearly as long as a
 * job is kept: were the waits to double, an hour's outage of the mail host would cost another hour.
 */
export const QUEUES: QueueSpec[] = [
  {
    name: 'send-mail',
    policy: 'standard',
    retryLimit: 38_000,
    retryDelay: 30,
    retryBackoff: false,
    expireInSeconds: 120,
  },
  { name: 'sweep', policy: 'singleton', retryLimit: 2, retryDelay: 30, expireInSeconds: 600 },
];
