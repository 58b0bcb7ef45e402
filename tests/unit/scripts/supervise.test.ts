import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { startedAt } from '@/scripts/steps/identity.mjs';
import { Supervisor } from '@/scripts/steps/supervise.mjs';

interface Noted {
  name: string;
  pid: number;
}

let logs: string;
let noted: Noted[];
let supervisor: Supervisor;

beforeEach(() => {
  logs = mkdtempSync(join(tmpdir(), 'ruckle logs '));
  noted = [];
  supervisor = new Supervisor({ logs }, (processes: Noted[]) => {
    noted = processes;
  });
});
afterEach(async () => {
  await supervisor.stop();
  rmSync(logs, { recursive: true });
});

const shell = (script: string) => ({
  name: 'worker',
  command: 'sh',
  args: ['-c', script],
  env: process.env,
  cwd: logs,
});
const log = () => readFileSync(join(logs, 'worker.log'), 'utf8');
const pid = () => noted.find(({ name }) => name === 'worker')?.pid ?? 0;

describe('a supervised process', () => {
  it('is started again when it is killed, and noted anew', async () => {
    supervisor.start(shell('echo up; sleep 60'));
    await vi.waitFor(() => expect(log()).toBe('up\n'), 3000);
    const first = pid();
    process.kill(first, 'SIGKILL');
    await vi.waitFor(() => expect(pid()).not.toBe(first), 3000);
    await vi.waitFor(() => expect(log()).toBe('up\nup\n'), 3000);
  });

  it('takes what it has started with it when it dies, and when all is stopped', async () => {
    supervisor.start(shell('sleep 60 & echo $!; wait'));
    await vi.waitFor(() => expect(log()).toMatch(/\d+\n/), 3000);
    const first = Number(log().trim());
    process.kill(pid(), 'SIGKILL');
    await vi.waitFor(() => expect(startedAt(first)).toBeNull(), 3000);
    await vi.waitFor(() => expect(log().trim().split('\n')).toHaveLength(2), 3000);
    const second = Number(log().trim().split('\n')[1]);
    await supervisor.stop();
    await vi.waitFor(() => expect(startedAt(second)).toBeNull(), 3000);
  });

  it('fails the whole when it dies again and again, and its log is named', async () => {
    supervisor.start(shell('echo dying; exit 3'));
    await expect(supervisor.during(sleep(20_000))).rejects.toThrow(join(logs, 'worker.log'));
    expect(log()).toBe('dying\n'.repeat(6));
  }, 25_000);

  it('fails the whole when it cannot be started at all', async () => {
    supervisor.start({ ...shell(''), command: join(logs, 'missing') });
    await expect(supervisor.during(sleep(5000))).rejects.toThrow('ENOENT');
  });

  it('is not started again once all is being stopped', async () => {
    supervisor.start(shell('echo up; sleep 60'));
    await vi.waitFor(() => expect(log()).toBe('up\n'), 3000);
    process.kill(pid(), 'SIGKILL');
    await supervisor.stop();
    await sleep(600);
    expect(log()).toBe('up\n');
  });
});

it('restarts what it watches, and holds its children back until that is ready', async () => {
  const server = { isUp: true, restarts: 0 };
  supervisor.watch({
    name: 'postgres',
    log: 'none',
    isAlive: () => server.isUp,
    isReady: () => server.isUp,
    restart: async () => {
      await sleep(700);
      Object.assign(server, { isUp: true, restarts: server.restarts + 1 });
    },
  });
  supervisor.start(shell('echo up; sleep 60'));
  await vi.waitFor(() => expect(log()).toBe('up\n'), 3000);
  server.isUp = false;
  process.kill(pid(), 'SIGKILL');
  await sleep(600);
  expect([log(), server.restarts]).toEqual(['up\n', 0]);
  await vi.waitFor(() => expect(log()).toBe('up\nup\n'), 5000);
  expect(server.restarts).toBe(1);
});
