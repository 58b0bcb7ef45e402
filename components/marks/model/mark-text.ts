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

function whereWords(points: Mark['points']): string {
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last) return '';
  const [from, to] = [placeWords(first), placeWords(last)];
  if (points.length === 1) return `at the ${from} of the photo`;
  return from === to ? `within the ${from} of the photo` : `from the ${from} to the ${to} of the photo`;
}

/** A mark in words, for ears, search and print: "Tight line, clear, your left, from the middle to the upper left of the photo". */
export function markText({ kind, severity, side, points, note }: Mark): string {
  const words = [KIND_WORDS[kind], SEVERITY_WORDS[severity], SIDE_WORDS[side], whereWords(points), note];
  return words.filter(Boolean).join(', ');
}
