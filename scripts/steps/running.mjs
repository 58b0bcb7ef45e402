import { setTimeout as sleep } from 'node:timers/promises';
import { isHealthy } from './answering.mjs';
import { putAside, stopCluster } from './cluster.mjs';
import { describe, end, isOurs } from './identity.mjs';
import { readRun, writeRun } from './run-file.mjs';
import { say, Stop } from './say.mjs';

const PATIENCE_MS = 20_000;
const STOPPING_MS_MAX = 30_000;

const originOf = (run) => `http://127.0.0.1:${run.ports.web}`;

/**
 * What to do about what `run.json` names, given whether its supervisor still runs.
 * @returns `start` (after ending what is left), `join` (it is ours: say where it is), `replace` or `refuse`
 */
export function decide(run, isRunning, { isDev, isFresh }) {
  if (!isRunning) return 'start';
  if (isFresh) return 'replace';
  return Boolean(run.isDev) === isDev ? 'join' : 'refuse';
}

/** Waits for a start that is under way or has been made. Null when it ends, or stays ill for too long. */
async function join(runFile) {
  let illMs = 0;
  let hasSaid = false;
  for (;;) {
    const run = readRun(runFile);
    if (!run.supervisor || !isOurs(run.supervisor)) return null;
    if (run.isReady && (await isHealthy(originOf(run)))) return originOf(run);
    if (run.isReady && illMs >= PATIENCE_MS) return null;
    if (run.isReady) illMs += 500;
    if (!run.isReady && !hasSaid) say('· another start is under way here: waiting for it …');
    hasSaid = true;
    await sleep(500);
  }
}

/** The address of what already runs in this clone and answers; null when there is something to start. */
export async function joinRunning(runFile, wanted) {
  const run = readRun(runFile);
  const decision = decide(run, Boolean(run.supervisor) && isOurs(run.supervisor), wanted);
  if (decision === 'refuse') {
    const [here, asked] = run.isDev ? ['npm run dev', 'npm start'] : ['npm start', 'npm run dev'];
    throw new Stop(`\`${here}\` runs in this clone already. Stop it (Ctrl-C) before \`${asked}\`.`);
  }
  return decision === 'join' ? join(runFile) : null;
}

/** Ends what an earlier start has left behind, once it is sure to be ours, and notes this process as the one that runs. */
export async function takeOver(folders, { isDev = false, isFresh = false }) {
  const before = readRun(folders.runFile);
  const claim = { supervisor: describe('supervisor', process.pid), isReady: false, isDev };
  writeRun(folders.runFile, { ...before, ...claim });
  if (before.supervisor) await end(before.supervisor, STOPPING_MS_MAX);
  await Promise.all(before.processes.map((one) => end(one)));
  if (isFresh) await moveDataAside(folders);
  const run = { ...readRun(folders.runFile), processes: [], ...claim };
  writeRun(folders.runFile, run);
  return run;
}

async function moveDataAside(folders) {
  await stopCluster(folders);
  for (const path of [folders.cluster, folders.objects, folders.mail, folders.runFile]) putAside(path);
  folders.make();
  say('· what was here is kept beside it as “.before”');
}
