import { spawn } from 'node:child_process';
import { appendFileSync, closeSync, openSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { describe, signalGroup } from './identity.mjs';
import { Restarts } from './restarts.mjs';
import { Stop } from './say.mjs';

const GRACE_MS = 8000;
const LOOK_MS = 500;

/**
 * Keeps a handful of processes alive. One that dies is started again; one that dies too often fails the whole, and the log that
 * says why is named.
 */
export class Supervisor {
  #children = new Map();
  #isStopping = false;
  #failed;
  #fail;
  #watched = [];

  /** @param onChange told the processes that now run, each time one is started */
  constructor(folders, onChange) {
    this.folders = folders;
    this.onChange = onChange;
    this.#failed = new Promise((_, reject) => {
      this.#fail = reject;
    });
    this.#failed.catch(() => {});
  }

  /** Waits for some work, but no longer than until a process has died too often. */
  async during(work) {
    return Promise.race([work, this.#failed]);
  }

  /** Never fulfils: rejects when a process has died too often. */
  get failed() {
    return this.#failed;
  }

  /** @param spec `{ name, command, args, env, cwd }` */
  start(spec, restarts = new Restarts()) {
    const log = join(this.folders.logs, `${spec.name}.log`);
    const out = openSync(log, 'a', 0o600);
    // A group of its own: Ctrl-C reaches only us, who stop all in order, and what it has started ends with it.
    const options = { cwd: spec.cwd, env: spec.env, stdio: ['ignore', out, out], detached: true };
    const child = spawn(spec.command, spec.args, options);
    closeSync(out);
    if (child.pid === undefined) {
      child.once('error', (error) => this.#fail(new Stop(`${spec.name}: ${error.message}`)));
      return;
    }
    this.#children.set(spec.name, child);
    child.once('exit', () => void this.#afterExit(spec, child, restarts, log));
    this.onChange(this.processes());
  }

  async #afterExit(spec, child, restarts, log) {
    this.#children.delete(spec.name);
    signalGroup(child.pid, 'SIGKILL');
    if (this.#isStopping) return;
    const pauseMs = restarts.next(Date.now());
    if (pauseMs === null) return this.#fail(diedTooOften(spec.name, log));
    this.#note(`${spec.name} ended (${child.exitCode ?? child.signalCode}): started again`);
    await sleep(pauseMs);
    // What it stands on comes first, else it would use up its restarts in the dark.
    while (!this.#isStopping && !this.#watched.every(({ isReady }) => isReady())) await sleep(LOOK_MS);
    if (!this.#isStopping) this.start(spec, restarts);
  }

  /** Watches over what is not our child, as a server that outlives a killed start; the children stand on it. */
  watch({ name, log, isAlive, isReady, restart }) {
    const restarts = new Restarts();
    const look = async () => {
      while (!this.#isStopping) {
        await sleep(LOOK_MS);
        if (this.#isStopping || isAlive()) continue;
        const pauseMs = restarts.next(Date.now());
        if (pauseMs === null) return this.#fail(diedTooOften(name, log));
        this.#note(`${name} is gone: started again`);
        await sleep(pauseMs);
        if (!this.#isStopping) await restart().catch((thrown) => this.#note(thrown.message));
      }
    };
    this.#watched.push({ isReady, done: look() });
  }

  // In a log of its own: the terminal's last line stays the address.
  #note(text) {
    appendFileSync(join(this.folders.logs, 'supervisor.log'), `${new Date().toISOString()} ${text}\n`);
  }

  processes() {
    return [...this.#children].map(([name, child]) => describe(name, child.pid));
  }

  async stop() {
    this.#isStopping = true;
    const ending = [...this.#children.values()].map((child) => {
      const gone = new Promise((resolve) => child.once('exit', resolve));
      signalGroup(child.pid, 'SIGTERM');
      const timer = setTimeout(() => signalGroup(child.pid, 'SIGKILL'), GRACE_MS);
      return gone.then(() => clearTimeout(timer));
    });
    await Promise.all([...ending, ...this.#watched.map(({ done }) => done)]);
  }
}

const diedTooOften = (name, log) => new Stop(`${name} stopped again and again. Its log says why: ${log}`);
