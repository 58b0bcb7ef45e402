import type { FigureView } from '../figure/figure';
import type { BodyMark } from './body-mark';

export type MarkState = 'gone' | 'eased' | 'same' | 'worse' | 'new' | 'hidden' | 'not-photographed';

export type ComparedMark = {
  readonly state: MarkState;
  readonly before: BodyMark | null;
  readonly after: BodyMark | null;
  /** Length after ÷ length before, both in crotch depths of their own photo; null where only one is there. */
  readonly lengthRatio: number | null;
};

export type CompareContext = {
  /** Views with a placed photo, by round. */
  readonly viewsBefore: ReadonlySet<FigureView>;
  readonly viewsAfter: ReadonlySet<FigureView>;
  /** Whether something tight would hide this mark in the later round, were it still there. */
  readonly isHidden: (mark: BodyMark) => boolean;
};

/** Crotch depths and degrees within which two marks are the same fold; a re-pinned, re-photographed body moves by a finger or two. */
const PLACE_GATE = 0.3;
const ANGLE_GATE_DEG = 35;
/** A line that grew or shrank by less is within what a hand draws (15 % each). */
const LENGTH_BAND = 1.33;

const meanGap = (a: BodyMark, b: BodyMark) =>
  a.path.reduce((sum, p) => sum + Math.min(...b.path.map((q) => Math.hypot(p.x - q.x, p.y - q.y))), 0) /
  a.path.length;

function turnBetween(a: BodyMark, b: BodyMark): number {
  if (a.angleDeg === null || b.angleDeg === null) return 0;
  const turn = Math.abs(a.angleDeg - b.angleDeg) % 180;
  return Math.min(turn, 180 - turn);
}

/** How unlike two marks are, 0 … 2; null where they cannot be the same thing. */
function unlikeness(a: BodyMark, b: BodyMark): number | null {
  if (a.kind !== b.kind || a.view !== b.view) return null;
  if (a.side !== null && b.side !== null && a.side !== b.side) return null;
  // The shorter lies along the longer: a fold that has half gone is still that fold.
  const place = Math.min(meanGap(a, b), meanGap(b, a)) / PLACE_GATE;
  const turn = turnBetween(a, b) / ANGLE_GATE_DEG;
  return place > 1 || turn > 1 ? null : place + turn;
}

function pairUp(before: readonly BodyMark[], after: readonly BodyMark[]): Map<BodyMark, BodyMark> {
  const candidates = before
    .flatMap((a) => after.map((b) => ({ a, b, cost: unlikeness(a, b) })))
    .filter((pair): pair is { a: BodyMark; b: BodyMark; cost: number } => pair.cost !== null)
    .sort((p, q) => p.cost - q.cost || (p.a.id + p.b.id < q.a.id + q.b.id ? -1 : 1));
  const pairs = new Map<BodyMark, BodyMark>();
  const taken = new Set<BodyMark>();
  for (const { a, b } of candidates) {
    if (pairs.has(a) || taken.has(b)) continue;
    pairs.set(a, b);
    taken.add(b);
  }
  return pairs;
}

function pairedState(before: BodyMark, after: BodyMark, ratio: number | null): MarkState {
  if (after.severity !== before.severity) return after.severity > before.severity ? 'worse' : 'eased';
  if (ratio === null || (ratio <= LENGTH_BAND && ratio >= 1 / LENGTH_BAND)) return 'same';
  return ratio > 1 ? 'worse' : 'eased';
}

/**
 * What became of each mark between two rounds, matched by place and kind on the body. The length of a photo's pixels says
 * nothing: lengths are compared in crotch depths, and only within one view.
 */
export function compareMarks(
  before: readonly BodyMark[],
  after: readonly BodyMark[],
  { viewsBefore, viewsAfter, isHidden }: CompareContext,
): ComparedMark[] {
  const pairs = pairUp(before, after);
  const paired = new Set(pairs.values());
  const fates = before.map((mark): ComparedMark => {
    const match = pairs.get(mark);
    if (match) {
      const lengthRatio = mark.length > 0 && match.length > 0 ? match.length / mark.length : null;
      return { state: pairedState(mark, match, lengthRatio), before: mark, after: match, lengthRatio };
    }
    const state = !viewsAfter.has(mark.view) ? 'not-photographed' : isHidden(mark) ? 'hidden' : 'gone';
    return { state, before: mark, after: null, lengthRatio: null };
  });
  const come = after
    .filter((mark) => !paired.has(mark))
    .map((mark): ComparedMark => {
      const state = viewsBefore.has(mark.view) ? 'new' : 'not-photographed';
      return { state, before: null, after: mark, lengthRatio: null };
    });
  return [...fates, ...come];
}

/**
 * Whether something tight of a later round lies where a slack mark of the earlier one lay: while it is there nobody can see
 * whether the spare cloth has gone.
 */
export function hiddenByTight(after: readonly BodyMark[]): (mark: BodyMark) => boolean {
  const tight = after.filter(({ kind, severity }) => kind === 'tight' && severity >= 2);
  return (mark) =>
    (mark.kind === 'slack' || mark.kind === 'pooling') &&
    tight.some(
      (one) =>
        one.view === mark.view &&
        one.zones.some(({ zone }) => mark.zones.some((other) => other.zone === zone)),
    );
}
