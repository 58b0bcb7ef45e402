import type { Mark } from './mark';

export interface SavedMark extends Mark {
  version: number;
}

/** What the server has of each of the viewer's marks. */
export type Known = Record<string, SavedMark>;

export interface MarkBatch {
  upserts: { mark: Mark; seen: number }[];
  deletes: { id: string; seen: number }[];
}

const bare = ({ id, kind, severity, side, points, note }: Mark): Mark => ({
  id,
  kind,
  severity,
  side,
  points,
  note,
});
const isSame = (a: Mark, b: Mark) => JSON.stringify(bare(a)) === JSON.stringify(bare(b));

export const knownFrom = (saved: SavedMark[]): Known =>
  Object.fromEntries(saved.map((mark) => [mark.id, mark]));

/** What the server does not have yet: the difference between what is on the photo and what it is known to hold. */
export function batchOf(marks: Mark[], known: Known): MarkBatch {
  const here = new Set(marks.map(({ id }) => id));
  return {
    upserts: marks
      .filter((mark) => !(known[mark.id] && isSame(mark, known[mark.id] as Mark)))
      .map((mark) => ({ mark: bare(mark), seen: known[mark.id]?.version ?? 0 })),
    deletes: Object.values(known)
      .filter(({ id }) => !here.has(id))
      .map(({ id, version }) => ({ id, seen: version })),
  };
}

export const batchSize = ({ upserts, deletes }: MarkBatch) => upserts.length + deletes.length;

export interface MarkConflict {
  id: string;
  /** What the server holds now; null when it was taken away elsewhere. */
  theirs: SavedMark | null;
}
export interface MarkAnswer {
  saved: SavedMark[];
  deleted: string[];
  conflicts: MarkConflict[];
}

export function knownAfter(known: Known, answer: MarkAnswer): Known {
  const next = { ...known, ...knownFrom(answer.saved) };
  for (const id of answer.deleted) delete next[id];
  return next;
}

/**
 * Lays what the server holds under what was done here and not yet sent: own edits stay, everything else follows the server.
 * The versions of edited marks stay those that were seen, so that a race still shows.
 */
export function mergeServer(
  marks: Mark[],
  known: Known,
  server: SavedMark[],
): { marks: Mark[]; known: Known } {
  const { upserts, deletes } = batchOf(marks, known);
  const edited = new Map(upserts.map(({ mark }) => [mark.id, mark]));
  const gone = new Set(deletes.map(({ id }) => id));
  const merged = server.filter(({ id }) => !gone.has(id)).map((mark) => edited.get(mark.id) ?? bare(mark));
  const onServer = new Set(server.map(({ id }) => id));
  const onlyHere = [...edited.values()].filter(({ id }) => !onServer.has(id));
  const next = knownFrom(server);
  for (const id of [...edited.keys(), ...gone]) {
    const seen = known[id];
    if (seen && next[id]) next[id] = seen;
  }
  return { marks: [...merged, ...onlyHere], known: next };
}
