import { existsSync, readdirSync } from 'node:fs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

export function checkNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major < 20 || (major === 20 && minor < 20)) {
    throw new Stop(`Ruckle needs Node.js 20.20 or newer; this is ${process.version}.`);
  }
}

/** Where Debian keeps the database's programs; null when they are not installed. */
export function postgresPrograms() {
  const base = '/usr/lib/postgresql';
  const versions = existsSync(base) ? readdirSync(base).map(Number).filter(Boolean) : [];
  const newest = versions
    .sort((a, b) => b - a)
    .find((version) => version >= 15 && existsSync(`${base}/${version}/bin/initdb`));
  return newest ? `${base}/${newest}/bin` : null;
}

const WANTED = {
  postgresql: () => postgresPrograms() !== null,
  chromium: () => existsSync('/usr/bin/chromium'),
};

/** Installs the Debian packages that are missing, or names the one command where this user may not. */
export async function ensurePackages(names) {
  const missing = names.filter((name) => !WANTED[name]());
  if (missing.length === 0) return;
  if (process.getuid?.() !== 0) {
    throw new Stop(
      `Missing on this machine: ${missing.join(', ')}. Run:\n  sudo apt-get install -y ${missing.join(' ')}\nthen start again.`,
    );
  }
  say(`· installing ${missing.join(' and ')} …`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  await run('apt-get', ['update'], { env, allowFailure: true });
  await run('apt-get', ['install', '-y', '--no-install-recommends', ...missing], { env });
}
