import type { MarkBatchInput, MarkDto, MarkInput } from './marks';

/** What is to be done with a batch, given what stands there. */
interface JudgedMarks {
  toWrite: MarkInput[];
  /** Stand there already as they were sent: an answer was lost on its way. */
  standing: MarkDto[];
  toDelete: string[];
  /** Gone after this: those to delete and those that were gone already. */
  deleted: string[];
  conflicts: { id: string; theirs: MarkDto | null }[];
  /** How many marks the layer holds after it. */
  countAfter: number;
}

const isSame = (now: MarkDto, sent: MarkInput) =>
  now.kind === sent.kind &&
  now.severity === sent.severity &&
  now.side === sent.side &&
  now.note === sent.note &&
  now.points.length === sent.points.length &&
  now.points.every(({ x, y }, i) => x === sent.points[i]?.x && y === sent.points[i]?.y);

/** Sorts a batch by what stands there. `seen` 0 means that the sender knows of no such mark. */
export function judgeMarks(
  held: readonly MarkDto[],
  { upserts, deletes }: Omit<MarkBatchInput, 'revision'>,
): JudgedMarks {
  const now = new Map(held.map((mark) => [mark.id, mark]));
  const judged: JudgedMarks = { toWrite: [], standing: [], toDelete: [], deleted: [], conflicts: [], countAfter: held.length }; // prettier-ignore
  for (const { mark, seen } of upserts) {
    const there = now.get(mark.id);
    if (there && isSame(there, mark)) judged.standing.push(there);
    else if (there ? there.version === seen : seen === 0) judged.toWrite.push(mark);
    else judged.conflicts.push({ id: mark.id, theirs: there ?? null });
  }
  for (const { id, seen } of deletes) {
    const there = now.get(id);
    if (there && there.version !== seen) judged.conflicts.push({ id, theirs: there });
    else {
      judged.deleted.push(id);
      if (there) judged.toDelete.push(id);
    }
  }
  judged.countAfter += judged.toWrite.filter(({ id }) => !now.has(id)).length - judged.toDelete.length;
  return judged;
}
