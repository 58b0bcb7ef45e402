import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { createServer, type AddressInfo, type Server } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { describe as note, end, isOurs, parseStat, startedAt } from '@/scripts/steps/identity.mjs';
import { isNodeSupported } from '@/scripts/steps/machine.mjs';
import { countPlaywright, countVitest } from '@/scripts/steps/parts.mjs';
import { freePort } from '@/scripts/steps/ports.mjs';
import { parsePostmaster } from '@/scripts/steps/postmaster.mjs';
import { Restarts } from '@/scripts/steps/restarts.mjs';
import { readRun, writeRun } from '@/scripts/steps/run-file.mjs';
import { decide } from '@/scripts/steps/running.mjs';
import { stampOf } from '@/scripts/steps/stamp.mjs';
import { placeOf } from '@/scripts/services/store.mjs';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'ruckle steps '));
});
afterEach(() => rmSync(folder, { recursive: true }));

async function listen(host: string): Promise<{ server: Server; port: number }> {
  const server = createServer().listen(0, host);
  await once(server, 'listening');
  return { server, port: (server.address() as AddressInfo).port };
}

describe('a port', () => {
  it.each(['127.0.0.1', '0.0.0.0', '::'])('that someone holds on %s is passed over', async (host) => {
    const { server, port } = await listen(host);
    const found = await freePort(port);
    server.close();
    expect(found).not.toBe(port);
    expect(found).toBeGreaterThan(1023);
  });

  it('is the first free one of those wished for, missing wishes left out', async () => {
    const { server, port: taken } = await listen('127.0.0.1');
    const { server: other, port: free } = await listen('127.0.0.1');
    other.close();
    await once(other, 'close');
    const found = await freePort(undefined, taken, free);
    server.close();
    expect(found).toBe(free);
  });
});

describe('a stamp', () => {
  const stamp = () => stampOf(folder, ['a', 'missing']);
  it('stays while nothing changes and changes with any content, name or new file', () => {
    writeFileSync(join(folder, 'a'), 'one');
    const first = stamp();
    expect(stamp()).toBe(first);
    writeFileSync(join(folder, 'a'), 'two');
    const second = stamp();
    writeFileSync(join(folder, 'missing'), '');
    expect(new Set([first, second, stamp()]).size).toBe(3);
  });

  it('tells files apart whose names and contents run into the same text', () => {
    writeFileSync(join(folder, 'a'), 'bc');
    writeFileSync(join(folder, 'ab'), 'c');
    expect(stampOf(folder, ['a'])).not.toBe(stampOf(folder, ['ab']));
  });
});

describe('the run file', () => {
  const file = () => join(folder, 'run.json');
  it('brings back what was written and is closed to others', () => {
    const run = { ...readRun(file()), ports: { web: 3001 } };
    writeRun(file(), run);
    expect(readRun(file())).toEqual(run);
    expect(statSync(file()).mode & 0o777).toBe(0o600);
  });

  it('is as new, with other secrets, where it is missing or damaged', () => {
    const missing = readRun(file());
    writeFileSync(file(), '{"secrets": {"su');
    const damaged = readRun(file());
    expect(damaged.ports).toEqual({});
    expect(damaged.secrets.super).not.toBe(missing.secrets.super);
    expect(damaged.secrets.super.length).toBeGreaterThanOrEqual(32);
  });
});

describe('what already runs', () => {
  const start = { isDev: false, isFresh: false };
  it.each([
    ['start', { isDev: false }, false, start],
    ['join', { isDev: false }, true, start],
    ['join', {}, true, start],
    ['join', { isDev: true }, true, { ...start, isDev: true }],
    ['refuse', { isDev: true }, true, start],
    ['refuse', { isDev: false }, true, { ...start, isDev: true }],
    ['replace', { isDev: false }, true, { ...start, isFresh: true }],
    ['start', { isDev: false }, false, { ...start, isFresh: true }],
  ])('leads to %s for %o, running: %s, wanted: %o', (decision, run, isRunning, wanted) => {
    expect(decide(run, isRunning, wanted)).toBe(decision);
  });
});

describe('a process that was noted down', () => {
  it('is known again, and not once it has ended', async () => {
    const child = spawn('sleep', ['60']);
    const noted = note('sleep', child.pid);
    expect(isOurs(noted)).toBe(true);
    const gone = once(child, 'exit');
    await end(noted);
    await gone;
    expect(isOurs(noted)).toBe(false);
    expect(startedAt(child.pid)).toBeNull();
  });

  it('is left alone when only its number is the same', async () => {
    const child = spawn('sleep', ['60']);
    const noted = note('sleep', child.pid);
    for (const another of [
      { ...noted, startedAt: '1' },
      { ...noted, boot: 'an earlier boot' },
      { ...noted, startedAt: null },
    ])
      await end(another);
    expect(isOurs(noted)).toBe(true);
    child.kill();
  });

  it('is ended firmly when it does not want to end', async () => {
    const child = spawn('sh', ['-c', 'trap "" TERM; echo deaf; while :; do sleep 1; done']);
    await once(child.stdout, 'data');
    const gone = once(child, 'exit');
    await end(note('deaf', child.pid), 200);
    expect(await gone).toEqual([null, 'SIGKILL']);
  });

  it('is read past a name with spaces and brackets', () => {
    const tail = Array.from({ length: 40 }, (_, i) => i + 4).join(' ');
    expect(parseStat(`12 (a) b (c)) S ${tail}`)).toEqual({ state: 'S', startedAt: '22' });
  });
});

it('reads a database server’s own note', () => {
  const text = '4711\n/var/lib/x y\n1790000000\n40123\n\n127.0.0.1\n  1638405   1\nready   \n';
  expect(parsePostmaster(text)).toEqual({ pid: 4711, port: 40123, isReady: true });
  expect(parsePostmaster(text.replace('ready', 'starting')).isReady).toBe(false);
});

describe('restarts', () => {
  it('are five within a minute, each after twice the pause, and no sixth', () => {
    const restarts = new Restarts();
    const pauses = [0, 1, 2, 3, 4, 5].map((second) => restarts.next(second * 1000));
    expect(pauses).toEqual([200, 400, 800, 1600, 3200, null]);
  });

  it('are forgotten after a minute', () => {
    const restarts = new Restarts();
    for (let hour = 0; hour < 50; hour += 1) expect(restarts.next(hour * 3_600_000)).toBe(200);
  });
});

describe('counting', () => {
  const vitest = { numPassedTests: 3, numFailedTests: 0, numPendingTests: 0, numTodoTests: 0 };
  const stats = { expected: 3, unexpected: 0, flaky: 0, skipped: 0 };
  it('takes what passed as passed', () => {
    expect(countVitest(vitest, 0)).toEqual({ passed: 3, failed: 0 });
    expect(countPlaywright({ stats }, 0)).toEqual({ passed: 3, failed: 0 });
  });
  it('takes skipped, planned and flaky tests as failed', () => {
    expect(countVitest({ ...vitest, numPendingTests: 1, numTodoTests: 1 }, 0).failed).toBe(2);
    expect(countPlaywright({ stats: { ...stats, skipped: 1, flaky: 1 } }, 0).failed).toBe(2);
  });
  it('takes a bad end without a failed test as one failure, and not as one more beside others', () => {
    expect(countVitest(vitest, 1).failed).toBe(1);
    expect(countPlaywright({ stats }, 1).failed).toBe(1);
    expect(countVitest({ ...vitest, numFailedTests: 2 }, 1).failed).toBe(2);
  });
});

it('runs on the Node versions that package.json names', () => {
  expect(['20.20.0', '22.1.0', '24.9.9'].map(isNodeSupported)).toEqual([true, true, true]);
  expect(['18.20.0', '20.19.9', '25.0.0'].map(isNodeSupported)).toEqual([false, false, false]);
});

describe('a place in the store', () => {
  it('is a bucket and a plain key', () => {
    expect(placeOf('/ruckle/a/b-1.webp')).toEqual({ bucket: 'ruckle', key: 'a/b-1.webp' });
    expect(placeOf('/ruckle/')).toEqual({ bucket: 'ruckle', key: '' });
    expect(placeOf('/ruckle')).toEqual({ bucket: 'ruckle', key: undefined });
  });

  it.each([
    '/',
    '/..',
    '/ruckle/../x',
    '/ruckle/a/../../x',
    '/ruckle/./x',
    '/ruckle//x',
    '/ruckle/a%2f..',
    '/ruckle/.x',
    '/ruckle/a b',
  ])('is not %s', (path) => {
    expect(placeOf(path)).toBeNull();
  });
});
