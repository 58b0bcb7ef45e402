import 'server-only';
import { setTimeout as wait } from 'node:timers/promises';

/**
 * An answer that comes no sooner than the slowest of its cases usually does: how long it took tells nobody whether an address
 * has an account.
 */
export async function inEvenTime<T>(leastMs: number, work: () => Promise<T>): Promise<T> {
  const [result] = await Promise.allSettled([work(), wait(leastMs)]);
  if (result.status === 'rejected') throw result.reason;
  return result.value;
}
