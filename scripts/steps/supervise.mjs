import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { openSync } from 'node:fs';
import { join } from 'node:path';
import { describe } from './identity.mjs';
import { Stop } from './say.mjs';

const RESTARTS_MAX = 5;

/**
 * Keeps a handful of processes alive. One that dies is started again, up to five times; then everything stops and the log that
 * says why is named.
 */
export class Supervisor {
  #children = new Map();
  #isStopping = false;
  #failed;
  #fail;

  constructor(folders, onChange) {
    this.folders = folders;
    this.onChange = onChange;
    this.failed = new Promise((_, reject) => {
      this.#fail = reject;
    });
    this.failed.catch(() => {});
  }

  /** @param spec `{ name, command, args, env, cwd }` */
  start(spec, restarts = 0) {
    const log = join(this.folders.logs, `${spec.name}.log`);
    const out = openSync(log, 'a', 0o600);
    const child = spawn(spec.command, spec.args, {
      cwd: spec.cwd,
      env: spec.env,
      stdio: ['ignore', out, out],
    });
    this.#children.set(spec.name, child);
    child.once('exit', () => {
      this.#children.delete(spec.name);
      if (this.#isStopping) return;
      if (restarts >= RESTARTS_MAX)
        return this.#fail(
          new Stop(`${spec.name} stopped ${RESTARTS_MAX + 1} times. Its log says why: ${log}`),
        );
      setTimeout(() => !this.#isStopping && this.start(spec, restarts + 1), 200 * 2 ** restarts);
    });
    this.onChange(this.processes());
    return child;
  }

  processes() {
    return [...this.#children].map(([name, child]) => describe(name, child.pid));
  }

  async stop() {
    this.#isStopping = true;
    const ending = [...this.#children.values()].map(async (child) => {
      if (child.exitCode !== null || child.signalCode !== null) return;
      const gone = once(child, 'exit');
      child.kill('SIGTERM');
      const timer = setTimeout(() => child.kill('SIGKILL'), 8000);
      await gone;
      clearTimeout(timer);
    });
    await Promise.all(ending);
  }
}
