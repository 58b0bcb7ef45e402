import 'server-only';
import type { Written } from '@/db/queries/outcome';
import { notFound, Problem } from './problem';

/** A guarded write on its way out: the row, a 404, or a 409 with both versions. */
export function unwrap<T>(written: Written<T>): T {
  if (written.kind === 'done') return written.value;
  if (written.kind === 'missing') throw notFound();
  const { mine, theirs } = written;
  throw new Problem(
    409,
    'conflict',
    'This was changed elsewhere meanwhile. Both versions are here; choose one.',
    { mine, theirs },
  );
}

/** What was found, or a 404. */
export function orNotFound<T>(value: T | null | false): T {
  if (value === null || value === false) throw notFound();
  return value;
}
