import { MARKS_MAX } from '../mark-limits-schema';
import { inOrder, isSameMark, type Mark } from './mark';

/** One mark before and after a step; null where it was not there. */
export interface MarkStep {
  id: string;
  before: Mark | null;
  after: Mark | null;
  /** Steps in a row with the same name are one: a note typed letter by letter, a mark nudged by arrows. */
  run: string | null;
}

/**
 * The marks of one photo in the order of drawing, and the steps that led here. Steps name the marks they touched and nothing
 * else: what another tab adds in between is neither lost by an undo nor brought back by a redo. Serialisable, so that undo
 * outlives a reload.
 */
export interface MarkHistory {
  marks: Mark[];
  past: MarkStep[];
  future: MarkStep[];
}

const STEPS_MAX = 200;

export const startHistory = (marks: readonly Mark[]): MarkHistory => ({
  marks: inOrder(marks),
  past: [],
  future: [],
});

const markOf = (history: MarkHistory, id: string): Mark | null =>
  history.marks.find((mark) => mark.id === id) ?? null;

/** The same marks with one of them put in, replaced or taken out. */
function withMark(marks: readonly Mark[], id: string, now: Mark | null): Mark[] {
  if (now && marks.some((mark) => mark.id === id)) return marks.map((mark) => (mark.id === id ? now : mark));
  const others = marks.filter((mark) => mark.id !== id);
  return now ? inOrder([...others, now]) : others;
}

const isSame = (a: Mark | null, b: Mark | null) => a === b || (a !== null && b !== null && isSameMark(a, b));

/** Makes a step. One that changes nothing is none. */
function step(history: MarkHistory, id: string, after: Mark | null, run: string | null = null): MarkHistory {
  const before = markOf(history, id);
  if (isSame(before, after)) return history;
  const last = history.past.at(-1);
  const goesOn = run !== null && last?.run === run && last.id === id;
  const made: MarkStep = { id, before: goesOn ? last.before : before, after, run };
  const past = [...(goesOn ? history.past.slice(0, -1) : history.past), made];
  return { marks: withMark(history.marks, id, after), past: past.slice(-STEPS_MAX), future: [] };
}

/** A photo that is full takes no more. */
export const addMark = (history: MarkHistory, mark: Mark): MarkHistory =>
  history.marks.length >= MARKS_MAX ? history : step(history, mark.id, mark);

export const removeMark = (history: MarkHistory, id: string): MarkHistory => step(history, id, null);

/** @param run a name that joins this edit to the one before it, when that has the same name and is of the same mark */
export function editMark(
  history: MarkHistory,
  id: string,
  edit: (mark: Mark) => Mark,
  run: string | null = null,
): MarkHistory {
  const now = markOf(history, id);
  return now ? step(history, id, edit(now), run) : history;
}

/** After an undo or a redo, the next edit is a step of its own. */
const endRun = (past: MarkStep[]): MarkStep[] =>
  past.map((made, i) => (i === past.length - 1 && made.run !== null ? { ...made, run: null } : made));

/** Takes the last step back. A step whose mark has been changed elsewhere since is passed over: nobody's work is overwritten. */
export function undo(history: MarkHistory): MarkHistory {
  const last = history.past.at(-1);
  if (!last) return history;
  const past = endRun(history.past.slice(0, -1));
  if (!isSame(markOf(history, last.id), last.after)) return undo({ ...history, past });
  return { marks: withMark(history.marks, last.id, last.before), past, future: [last, ...history.future] };
}

export function redo(history: MarkHistory): MarkHistory {
  const [next, ...future] = history.future;
  if (!next) return history;
  if (!isSame(markOf(history, next.id), next.before)) return redo({ ...history, future });
  return {
    marks: withMark(history.marks, next.id, next.after),
    past: endRun([...history.past, next]),
    future,
  };
}

/** What came from elsewhere (another tab) is laid in without becoming a step of one's own. */
export const replaceMarks = (history: MarkHistory, marks: readonly Mark[]): MarkHistory => ({
  ...history,
  marks: inOrder(marks),
});
