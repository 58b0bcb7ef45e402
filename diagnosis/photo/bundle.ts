import { axisOf, middleOf, type BodyMark } from './body-mark';
import { meetingPoint, type Meeting } from './meeting-point';

/** Marks of one kind, view and side that belong together. */
export type Bundle = { readonly marks: readonly BodyMark[]; readonly meeting: Meeting };

/** Crotch depths between two marks of one bundle: about a hand's breadth. */
const REACH = 0.35;

function gap(a: BodyMark, b: BodyMark): number {
  return Math.min(...a.path.map((p) => Math.min(...b.path.map((q) => Math.hypot(p.x - q.x, p.y - q.y)))));
}

const belong = (a: BodyMark, b: BodyMark) =>
  a.kind === b.kind && a.view === b.view && a.side === b.side && gap(a, b) <= REACH;

/** Where the lines of some marks meet, strays losing their weight. */
export function meetingOf(marks: readonly BodyMark[]): Meeting {
  const lines = marks
    .filter(({ length }) => length > 0)
    .map(({ path }) => ({ at: middleOf(path), along: axisOf(path) }));
  return meetingPoint(lines, { robust: true });
}

/** Sorts marks into bundles: whoever lies within reach of one of a bundle belongs to it. Pins stay alone. */
export function bundleMarks(marks: readonly BodyMark[]): Bundle[] {
  const left = new Set(marks);
  const bundles: Bundle[] = [];
  for (const first of marks) {
    if (!left.delete(first)) continue;
    const found = [first];
    for (let at = 0; at < found.length && first.kind !== 'pin'; at += 1) {
      for (const other of left) {
        if (!belong(found[at]!, other)) continue;
        left.delete(other);
        found.push(other);
      }
    }
    bundles.push({ marks: found, meeting: meetingOf(found) });
  }
  return bundles;
}
