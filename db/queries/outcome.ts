/** The expected endings of a guarded write. A conflict brings both versions: nobody's text is overwritten. */
export type Written<T> =
  { kind: 'done'; value: T } | { kind: 'conflict'; mine: unknown; theirs: T } | { kind: 'missing' };

export const done = <T>(value: T): Written<T> => ({ kind: 'done', value });
export const missing = <T>(): Written<T> => ({ kind: 'missing' });
