import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';

function filesBelow(path) {
  const stat = statSync(path, { throwIfNoEntry: false });
  if (!stat) return [];
  if (!stat.isDirectory()) return [path];
  return readdirSync(path)
    .sort()
    .flatMap((name) => filesBelow(join(path, name)));
}

/** A hash over the contents of files and folders: the same stamp means that nothing has to be done again. */
export function stampOf(root, paths) {
  const hash = createHash('sha256').update(process.version);
  for (const path of paths) {
    for (const file of filesBelow(join(root, path)))
      hash.update(file.slice(root.length)).update('\0').update(readFileSync(file));
  }
  return hash.digest('hex');
}
