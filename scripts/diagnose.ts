import { readFileSync } from 'node:fs';
import path from 'node:path';
import { runCommand } from '../diagnosis/command/run';
import { trousers } from '../diagnosis/garments/trousers';
import { findSigns } from '../diagnosis/words/search';

/** `npm run --silent diagnose -- case.json`: reads a case and prints its reading; see DEVELOPERS.md. */

function read(name: string): Uint8Array | string {
  // npm runs scripts in the package's folder; a path means the folder that the caller stands in.
  const callersFolder = process.env.INIT_CWD ?? process.cwd();
  try {
    return readFileSync(name === '-' ? 0 : path.resolve(callersFolder, name));
  } catch (error) {
    return error instanceof Error && 'code' in error ? String(error.code) : String(error);
  }
}

const result = runCommand(process.argv.slice(2), {
  garments: { [trousers.garment]: trousers },
  findSigns,
  read,
});
process.exitCode = result.status;
if (result.status === 0) process.stdout.write(result.stdout);
else process.stderr.write(result.stderr);
