import { existsSync, readdirSync } from 'node:fs';
import { run } from './run.mjs';
import { say, Stop } from './say.mjs';

/** Whether a Node.js version is one that the pinned packages run on: 20.20 up to, not including, 25 (as package.json says). */
export function isNodeSupported(version) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  return (major > 20 && major < 25) || (major === 20 && minor >= 20);
}

export function checkNode() {
  if (!isNodeSupported(process.versions.node))
    throw new Stop(`Ruckle needs Node.js from 20.20 to 24; this is ${process.version}.`);
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

const IS_THERE = {
  postgresql: () => postgresPrograms() !== null,
  chromium: () => existsSync('/usr/bin/chromium'),
};
const missingOf = (names) => names.filter((name) => !IS_THERE[name]());

/** Installs the Debian packages that are missing, or names the one command where that cannot be done here. */
export async function ensurePackages(names) {
  const missing = missingOf(names);
  if (missing.length === 0) return;
  const isRoot = process.getuid?.() === 0;
  if (isRoot) {
    say(`· installing ${missing.join(' and ')} …`);
    const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
    await run('apt-get', ['update'], { env, allowFailure: true });
    const args = ['install', '-y', '--no-install-recommends', ...missing];
    await run('apt-get', args, { env, allowFailure: true });
  }
  const still = missingOf(names);
  if (still.length === 0) return;
  const command = `${isRoot ? '' : 'sudo '}apt-get install -y ${still.join(' ')}`;
  throw new Stop(`Missing on this machine: ${still.join(', ')}. Run this, then start again:\n  ${command}`);
}
