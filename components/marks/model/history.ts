import type { Mark } from './mark';

/** The marks of one photo, and the states before and after this one. Serialisable, so that undo outlives a reload. */
export interface MarkHistory {
  marks: Mark[];
  past: Mark[][];
  future: Mark[][];
}

const STEPS_MAX = 60;

export const startHistory = (marks: Mark[]): MarkHistory => ({ marks, past: [], future: [] });

/** A step that can be taken back. One that changes nothing is none. */
export function change(history: MarkHistory, marks: Mark[]): MarkHistory {
  if (JSON.stringify(marks) === JSON.stringify(history.marks)) return history;
  return { marks, past: [...history.past, history.marks].slice(-STEPS_MAX), future: [] };
}

export const addMark = (history: MarkHistory, mark: Mark) => change(history, [...history.marks, mark]);
export const removeMark = (history: MarkHistory, id: string) =>
  change(
    history,
    history.marks.filter((mark) => mark.id !== id),
  );
export const editMark = (history: MarkHistory, id: string, edit: (mark: Mark) => Mark) =>
  change(
    history,
    history.marks.map((mark) => (mark.id === id ? edit(mark) : mark)),
  );

export function undo({ marks, past, future }: MarkHistory): MarkHistory {
  const before = past.at(-1);
  return before
    ? { marks: before, past: past.slice(0, -1), future: [marks, ...future] }
    : { marks, past, future };
}

export function redo({ marks, past, future }: MarkHistory): MarkHistory {
  const [next, ...rest] = future;
  return next ? { marks: next, past: [...past, marks], future: rest } : { marks, past, future };
}

/** What came from elsewhere (another tab, a fitter) is laid in without becoming a step of one's own. */
export const replaceMarks = (history: MarkHistory, marks: Mark[]): MarkHistory => ({ ...history, marks });
