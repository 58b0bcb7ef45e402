import { bareMark, inOrder, isSameMark, type Mark } from './mark';

export interface SavedMark extends Mark {
  version: number;
}

/** What the server is known to have of the viewer's own marks, by id. */
export type Known = Record<string, SavedMark>;

/** What was sent and not answered, by id: each mark as it was sent, null for a deletion. Any of them may have arrived. */
export type Unsure = Record<string, (Mark | null)[]>;

/** Where one photo's marks stand between here and the server. Serialisable. */
export interface Standing {
  known: Known;
  unsure: Unsure;
}

export interface MarkBatch {
  upserts: { mark: Mark; seen: number }[];
  deletes: { id: string; seen: number }[];
}

const isSame = (a: Mark | null, b: Mark | null) => (a === null || b === null ? a === b : isSameMark(a, b));

/** A request stays far below the longest body that is read, however long the lines are. */
const BATCH_MAX = 50;

export const startStanding = (): Standing => ({ known: {}, unsure: {} });

const knownFrom = (saved: readonly SavedMark[]): Known =>
  Object.fromEntries(saved.map((mark) => [mark.id, mark]));

/** What the server does not have yet, or may not have: the difference between what is on the photo and what it is known to hold. */
export function batchOf(marks: readonly Mark[], { known, unsure }: Standing): MarkBatch {
  const here = new Set(marks.map(({ id }) => id));
  const isHeld = (mark: Mark) => {
    const held = known[mark.id];
    return held !== undefined && isSameMark(mark, held) && !(mark.id in unsure);
  };
  // A new mark that was sent, not answered and then deleted may stand on the server.
  const sentAndGone = Object.keys(unsure).filter(
    (id) => unsure[id]?.some((sent) => sent !== null) && !known[id] && !here.has(id),
  );
  return {
    upserts: marks
      .filter((mark) => !isHeld(mark))
      .map((mark) => ({ mark: bareMark(mark), seen: known[mark.id]?.version ?? 0 })),
    deletes: [
      ...Object.values(known)
        .filter(({ id }) => !here.has(id))
        .map(({ id, version }) => ({ id, seen: version })),
      ...sentAndGone.map((id) => ({ id, seen: 1 })),
    ],
  };
}

export const batchSize = ({ upserts, deletes }: MarkBatch) => upserts.length + deletes.length;

/** As much of a batch as one request takes, without what waits for the person's choice. */
export function partToSend({ upserts, deletes }: MarkBatch, contested: ReadonlySet<string>): MarkBatch {
  const first = upserts.filter(({ mark }) => !contested.has(mark.id)).slice(0, BATCH_MAX);
  return {
    upserts: first,
    deletes: deletes.filter(({ id }) => !contested.has(id)).slice(0, BATCH_MAX - first.length),
  };
}

/** Before a batch goes out: from now on nobody here can say whether it arrived. */
export function whenSent(standing: Standing, { upserts, deletes }: MarkBatch): Standing {
  const unsure = { ...standing.unsure };
  const note = (id: string, sent: Mark | null) => {
    const before = unsure[id] ?? [];
    if (!before.some((one) => isSame(one, sent))) unsure[id] = [...before, sent];
  };
  for (const { mark } of upserts) note(mark.id, mark);
  for (const { id } of deletes) note(id, null);
  return { ...standing, unsure };
}

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

/** What the server holds is what was sent from here and never answered: an echo, nobody else's edit. */
const isEcho = ({ unsure }: Standing, { id, theirs }: MarkConflict): boolean =>
  (unsure[id] ?? []).some((sent) => isSame(sent, theirs));

/**
 * Takes an answer in. `before` is how things stood before that batch went out: what was unsure then tells echoes of lost
 * answers from edits of others.
 */
export function whenAnswered(
  standing: Standing,
  before: Standing,
  answer: MarkAnswer,
): { standing: Standing; conflicts: MarkConflict[] } {
  const known = { ...standing.known, ...knownFrom(answer.saved) };
  const unsure = { ...standing.unsure };
  for (const { id } of answer.saved) delete unsure[id];
  for (const id of answer.deleted) {
    delete known[id];
    delete unsure[id];
  }
  const conflicts: MarkConflict[] = [];
  for (const conflict of answer.conflicts) {
    delete unsure[conflict.id];
    if (!isEcho(before, conflict)) conflicts.push(conflict);
    else if (conflict.theirs) known[conflict.id] = conflict.theirs;
    else delete known[conflict.id];
  }
  return { standing: { known, unsure }, conflicts };
}

/**
 * Lays what the server holds under what was done here and not yet sent: own edits stay, everything else follows the server.
 * The versions of edited marks stay those that were seen, so that a race still shows.
 */
export function mergeServer(
  marks: readonly Mark[],
  standing: Standing,
  server: readonly SavedMark[],
): { marks: Mark[]; standing: Standing } {
  const { upserts, deletes } = batchOf(marks, standing);
  const edited = new Map(upserts.map(({ mark }) => [mark.id, mark]));
  const gone = new Set(deletes.map(({ id }) => id));
  const merged = server
    .filter(({ id }) => !gone.has(id))
    .map((mark) => edited.get(mark.id) ?? bareMark(mark));
  const onServer = new Set(server.map(({ id }) => id));
  const onlyHere = [...edited.values()].filter(({ id }) => !onServer.has(id));
  const known = knownFrom(server);
  for (const id of [...edited.keys(), ...gone]) {
    const seen = standing.known[id];
    if (seen) known[id] = seen;
  }
  return { marks: inOrder([...merged, ...onlyHere]), standing: { known, unsure: standing.unsure } };
}

/** The person has chosen between two versions: theirs is taken over, or one's own is sent knowing of theirs. */
export function settleConflict(
  marks: readonly Mark[],
  { known, unsure }: Standing,
  { id, theirs }: MarkConflict,
  keepsMine: boolean,
): { marks: Mark[]; standing: Standing } {
  const { [id]: _seen, ...others } = known;
  const standing = { known: theirs ? { ...others, [id]: theirs } : others, unsure };
  if (keepsMine) return { marks: [...marks], standing };
  const without = marks.filter((mark) => mark.id !== id);
  return { marks: theirs ? inOrder([...without, bareMark(theirs)]) : without, standing };
}
