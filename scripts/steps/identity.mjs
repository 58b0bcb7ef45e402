import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

/** When a process began, in clock ticks since boot; null when it is gone. With its number it names one process and no later one. */
export function startedAt(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name in brackets may hold spaces: count from the last bracket. Field 22 of the whole is the 20th after it.
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19] ?? null;
  } catch {
    return null;
  }
}

export const describe = (name, pid) => ({ name, pid, startedAt: startedAt(pid) });

/** Whether this is still the very process that was noted down. */
export const isOurs = ({ pid, startedAt: noted }) => noted !== null && startedAt(pid) === noted;

/** Ends a noted process kindly, then firmly. Another that has taken its number is left alone. */
export async function end(noted, graceMs = 5000) {
  if (!isOurs(noted)) return;
  process.kill(noted.pid, 'SIGTERM');
  for (let waited = 0; waited < graceMs && isOurs(noted); waited += 50) await sleep(50);
  if (isOurs(noted)) process.kill(noted.pid, 'SIGKILL');
}
