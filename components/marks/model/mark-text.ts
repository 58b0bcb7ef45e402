import type { Mark, MarkKind } from './mark';
import { placeWords } from './place-words';

export const KIND_WORDS: Record<MarkKind, string> = {
  tight: 'Tight line',
  slack: 'Slack fold',
  gap: 'Gap',
  pooling: 'Pooling',
  tilt: 'Tilt',
  pin: 'Pin',
};
export const SEVERITY_WORDS = { 1: 'faint', 2: 'clear', 3: 'pulling' } as const;
const SIDE_WORDS = { left: 'your left', right: 'your right', both: '' } as const;

/** A mark in words, for ears, search and print: "Tight line, clear, your left, from the middle to the upper left of the photo". */
export function markText(mark: Mark): string {
  const first = mark.points[0];
  const last = mark.points.at(-1);
  const where =
    !first || !last
      ? ''
      : mark.points.length === 1
        ? `at the ${placeWords(first)} of the photo`
        : `from the ${placeWords(first)} to the ${placeWords(last)} of the photo`;
  const parts = [
    KIND_WORDS[mark.kind],
    SEVERITY_WORDS[mark.severity],
    SIDE_WORDS[mark.side],
    where,
    mark.note,
  ];
  return parts.filter(Boolean).join(', ');
}
