import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { Stop } from './say.mjs';

/**
 * Runs a command to its end.
 * @param options.quiet keeps its output back unless it fails
 * @returns what it printed on standard output
 */
export async function run(command, args, { quiet = true, allowFailure = false, ...options } = {}) {
  const child = spawn(command, args, { stdio: ['ignore', 'pipe', 'pipe'], ...options });
  let printed = '';
  let all = '';
  child.stdout.on('data', (chunk) => {
    printed += chunk;
    all += chunk;
    if (!quiet) process.stdout.write(chunk);
  });
  child.stderr.on('data', (chunk) => {
    all += chunk;
    if (!quiet) process.stderr.write(chunk);
  });
  const [code] = await Promise.race([
    once(child, 'close'),
    once(child, 'error').then(([error]) => {
      throw new Stop(`${command} could not be started: ${error.message}`);
    }),
  ]);
  if (code !== 0 && !allowFailure)
    throw new Stop(`${quiet ? all : ''}\n${command} ${args[0] ?? ''} ended with ${code}.`);
  return { code, printed };
}
