import type { MarkKind } from './model/mark';

/** What the hand holds: a kind of mark to draw, or nothing but the eye. */
export type Tool = MarkKind | 'look';
