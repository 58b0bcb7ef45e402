import { readFileSync } from 'node:fs';
import { join } from 'node:path';

interface Run {
  cluster: string;
  processes: { name: string; pid: number }[];
}

const readRun = () => JSON.parse(readFileSync(process.env.RUN_JSON ?? '', 'utf8')) as Run;

/** Ends a process of the running application as a power cut would; false when it is down already. */
function killAtOnce(pid: number | undefined): boolean {
  if (!pid) return false;
  try {
    process.kill(pid, 'SIGKILL');
    return true;
  } catch {
    return false;
  }
}

export const kill = (name: 'web' | 'worker' | 'store'): boolean =>
  killAtOnce(readRun().processes.find((process) => process.name === name)?.pid);

export const killDatabase = (): boolean =>
  killAtOnce(Number(readFileSync(join(readRun().cluster, 'postmaster.pid'), 'utf8').split('\n')[0]));
