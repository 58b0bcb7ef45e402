import { readFileSync } from 'node:fs';
import { setTimeout as sleep } from 'node:timers/promises';

const bootOf = () => readFileSync('/proc/sys/kernel/random/boot_id', 'utf8').trim();

/**
 * The state letter and the start time out of one line of `/proc/<pid>/stat` (proc(5), fields 3 and 22).
 * The name in brackets may itself hold spaces and brackets: count from the last one.
 */
export function parseStat(line) {
  const fields = line.slice(line.lastIndexOf(')') + 2).split(' ');
  return { state: fields[0], startedAt: fields[19] ?? null };
}

/** When a process began, in clock ticks since boot; null when it is gone or only waits to be buried. */
export function startedAt(pid) {
  try {
    const { state, startedAt } = parseStat(readFileSync(`/proc/${pid}/stat`, 'utf8'));
    return state === 'Z' ? null : startedAt;
  } catch {
    return null;
  }
}

/** Number, start and boot together name one process and no later one, whatever title it gives itself. */
export const describe = (name, pid) => ({ name, pid, startedAt: startedAt(pid), boot: bootOf() });

/** Whether this is still the very process that was noted down. */
export const isOurs = ({ pid, startedAt: noted, boot }) =>
  noted !== null && boot === bootOf() && startedAt(pid) === noted;

/** Sends a signal to a process group that we made: a child of ours with all it has started. Gone is as good. */
export function signalGroup(leaderPid, signal) {
  try {
    process.kill(-leaderPid, signal);
  } catch (thrown) {
    if (thrown.code !== 'ESRCH') throw thrown;
  }
}

/** Ends a noted process kindly, then firmly. Another that has taken its number is left alone. */
export async function end(noted, graceMs = 5000) {
  if (!isOurs(noted)) return;
  process.kill(noted.pid, 'SIGTERM');
  for (let waitedMs = 0; waitedMs < graceMs && isOurs(noted); waitedMs += 50) await sleep(50);
  signalGroup(noted.pid, 'SIGKILL');
  if (isOurs(noted)) process.kill(noted.pid, 'SIGKILL');
}
