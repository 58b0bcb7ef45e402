import { randomBytes } from 'node:crypto';
import { closeSync, fsyncSync, openSync, readFileSync, renameSync, writeSync } from 'node:fs';

const secret = () => randomBytes(24).toString('base64url');

const freshRun = () => ({
  secrets: {
    super: secret(),
    owner: secret(),
    app: secret(),
    purge: secret(),
    storeKeyId: `ruckle${randomBytes(6).toString('hex')}`,
    storeSecret: secret(),
  },
  ports: {},
  processes: [],
  stamps: {},
});

/** What a run must remember from one start to the next: its secrets, ports, processes and stamps. Missing or damaged is as new. */
export function readRun(file) {
  try {
    return { ...freshRun(), ...JSON.parse(readFileSync(file, 'utf8')) };
  } catch (thrown) {
    if (thrown.code === 'ENOENT' || thrown instanceof SyntaxError) return freshRun();
    throw thrown;
  }
}

/** Readable by its user only; whole or not at all, and on the disk: without its secrets the database cannot be opened. */
export function writeRun(file, run) {
  const out = openSync(`${file}.new`, 'w', 0o600);
  writeSync(out, `${JSON.stringify(run, null, 2)}\n`);
  fsyncSync(out);
  closeSync(out);
  renameSync(`${file}.new`, file);
}
