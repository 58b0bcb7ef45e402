import type { MarkDto } from '@/db/queries/marks';
import { type MarkSeverity, photoPoint } from './model/mark';
import type { MarkAnswer, SavedMark } from './model/sync';

export const savedMark = ({ points, severity, ...mark }: MarkDto): SavedMark => ({
  ...mark,
  severity: Math.min(3, Math.max(1, severity)) as MarkSeverity,
  points: points.map(({ x, y }) => photoPoint(x, y)),
});

export interface ServerAnswer {
  saved: MarkDto[];
  deleted: string[];
  conflicts: { id: string; theirs: MarkDto | null }[];
}

export const answerOf = ({ saved, deleted, conflicts }: ServerAnswer): MarkAnswer => ({
  saved: saved.map(savedMark),
  deleted,
  conflicts: conflicts.map(({ id, theirs }) => ({ id, theirs: theirs && savedMark(theirs) })),
});
