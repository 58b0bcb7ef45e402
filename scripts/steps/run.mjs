import { spawn } from 'node:child_process';
import { once } from 'node:events';
import { signalGroup } from './identity.mjs';
import { Stop } from './say.mjs';

const running = new Set();
let isEnding = false;

/** Ends whatever command is being run, with all it has started: we are stopping. */
export function endCommands() {
  isEnding = true; // what they say while they are being ended is nobody's concern
  for (const child of running) signalGroup(child.pid, 'SIGTERM');
}

/**
 * Runs a command to its end.
 * @param options.quiet keeps its output back unless it fails
 * @param options.input what it is given on standard input
 * @returns its exit code and what it printed on standard output
 */
export async function run(
  command,
  args,
  { quiet = true, allowFailure = false, input = '', ...options } = {},
) {
  // A group of its own: Ctrl-C reaches only us, who end it in order.
  const child = spawn(command, args, { stdio: 'pipe', detached: true, ...options });
  if (child.pid !== undefined) running.add(child);
  child.stdin.on('error', () => {}); // it did not want to read; its exit code tells
  child.stdin.end(input);
  let printed = '';
  let all = '';
  child.stdout.on('data', (chunk) => {
    printed += chunk;
    all += chunk;
    if (!quiet && !isEnding) process.stdout.write(chunk);
  });
  child.stderr.on('data', (chunk) => {
    all += chunk;
    if (!quiet && !isEnding) process.stderr.write(chunk);
  });
  try {
    const [code] = await once(child, 'close');
    if (code !== 0 && !allowFailure)
      throw new Stop(`${quiet ? all : ''}\n${command} ${args[0] ?? ''} ended with ${code}.`);
    return { code, printed };
  } catch (thrown) {
    if (thrown.syscall?.startsWith('spawn'))
      throw new Stop(`${command} could not be started: ${thrown.message}`);
    throw thrown;
  } finally {
    running.delete(child);
  }
}
