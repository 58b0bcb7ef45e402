import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { startedAt } from './identity.mjs';

/** The lines of a server's own note that matter here (PostgreSQL manual, "Database File Layout", postmaster.pid). */
export function parsePostmaster(text) {
  const lines = text.split('\n').map((line) => line.trim());
  return { pid: Number(lines[0]), port: Number(lines[3]), isReady: lines[7] === 'ready' };
}

function readOrNull(file) {
  try {
    return readFileSync(file, 'utf8');
  } catch {
    return null;
  }
}

/** The running server of this very cluster; null when none runs, or its number now belongs to something else. */
export function findPostmaster(folders) {
  const note = readOrNull(join(folders.cluster, 'postmaster.pid'));
  if (note === null) return null;
  const found = parsePostmaster(note);
  if (!found.pid || startedAt(found.pid) === null) return null;
  const commandLine = readOrNull(`/proc/${found.pid}/cmdline`) ?? '';
  return commandLine.split('\0').includes(folders.cluster) ? found : null;
}

/** Waits until a server that is just starting or stopping has done so. */
export async function settledPostmaster(folders, withinMs = 30_000) {
  for (let waitedMs = 0; waitedMs < withinMs; waitedMs += 100) {
    const found = findPostmaster(folders);
    if (found === null || found.isReady) return found;
    await sleep(100);
  }
  return null;
}
