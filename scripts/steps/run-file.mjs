import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

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

/** What a run must remember from one start to the next: its secrets, ports, processes and stamps. Readable by its user only. */
export function readRun(file) {
  if (!existsSync(file)) return freshRun();
  try {
    return { ...freshRun(), ...JSON.parse(readFileSync(file, 'utf8')) };
  } catch {
    return freshRun();
  }
}

export function writeRun(file, run) {
  writeFileSync(`${file}.new`, `${JSON.stringify(run, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.new`, file);
}
