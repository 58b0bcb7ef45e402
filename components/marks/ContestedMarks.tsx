'use client';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { Mark } from './model/mark';
import { markText } from './model/mark-text';
import type { MarkConflict } from './model/sync';

interface Props {
  marks: Mark[];
  conflicts: MarkConflict[];
  onSettle: (conflict: MarkConflict, keepsMine: boolean) => void;
}

/** A mark changed in two places: both versions, and the choice. */
export function ContestedMarks({ marks, conflicts, onSettle }: Props) {
  if (conflicts.length === 0) return null;
  return (
    <Notice tone="care" title="Changed elsewhere too" role="alert">
      <ul className="grid gap-3">
        {conflicts.map((conflict) => {
          const mine = marks.find(({ id }) => id === conflict.id);
          return (
            <li key={conflict.id} className="grid gap-2">
              <span>Here: {mine ? markText(mine) : 'deleted'}.</span>
              <span>Elsewhere: {conflict.theirs ? markText(conflict.theirs) : 'deleted'}.</span>
              <span className="flex flex-wrap gap-2">
                <Button onClick={() => onSettle(conflict, true)}>Keep mine</Button>
                <Button onClick={() => onSettle(conflict, false)}>Take the other</Button>
              </span>
            </li>
          );
        })}
      </ul>
    </Notice>
  );
}
