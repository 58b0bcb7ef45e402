'use client';
import { ArrowDown, ArrowLeft, ArrowRight, ArrowUp, Trash2 } from 'lucide-react';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { useState } from 'react';
import { NOTE_MAX } from './mark-limits-schema';
import {
  changeKind,
  type Mark,
  MARK_KINDS,
  type MarkKind,
  type MarkSide,
  moveMark,
  movePoint,
  photoPoint,
} from './model/mark';
import { KIND_WORDS } from './model/mark-text';

interface Props {
  mark: Mark;
  /** @param run edits in a row with the same name are one step back */
  onEdit: (edit: (mark: Mark) => Mark, run?: string) => void;
  onDelete: () => void;
}

const STRENGTHS = [
  { value: '1', label: 'Faint' },
  { value: '2', label: 'Clear' },
  { value: '3', label: 'Pulling' },
] as const;
const SIDES = [
  { value: 'both', label: 'Both' },
  { value: 'left', label: 'Your left' },
  { value: 'right', label: 'Your right' },
] as const;

const NUDGE = 0.005;
const NUDGES = [
  { label: 'left', Icon: ArrowLeft, dx: -NUDGE, dy: 0 },
  { label: 'right', Icon: ArrowRight, dx: NUDGE, dy: 0 },
  { label: 'up', Icon: ArrowUp, dx: 0, dy: -NUDGE },
  { label: 'down', Icon: ArrowDown, dx: 0, dy: NUDGE },
] as const;

/** Everything about one mark, without drawing. */
export function MarkEditor({ mark, onEdit, onDelete }: Props) {
  return (
    <div className="grid gap-3 border-l-4 border-chalk bg-paper px-4 py-3">
      <SelectField
        label="What it is"
        value={mark.kind}
        onChange={(event) => onEdit((now) => changeKind(now, event.target.value as MarkKind))}
      >
        {MARK_KINDS.map((kind) => (
          <option key={kind} value={kind}>
            {KIND_WORDS[kind]}
          </option>
        ))}
      </SelectField>
      <Choice
        legend="How strong"
        options={STRENGTHS}
        value={String(mark.severity) as '1' | '2' | '3'}
        onChange={(value) => onEdit((now) => ({ ...now, severity: Number(value) as Mark['severity'] }))}
      />
      <Choice
        legend="On which leg"
        options={SIDES}
        value={mark.side}
        onChange={(side: MarkSide) => onEdit((now) => ({ ...now, side }))}
      />
      <TextField
        label="Note"
        maxLength={NOTE_MAX}
        value={mark.note}
        onChange={(event) => onEdit((now) => ({ ...now, note: event.target.value }), 'note')}
      />
      <MoveIt key={mark.id} mark={mark} onEdit={onEdit} />
      <div>
        <Button look="danger" onClick={onDelete}>
          <Trash2 aria-hidden size={20} />
          Delete
        </Button>
      </div>
    </div>
  );
}

const partWords = (index: number, count: number) =>
  index === 0 ? 'The first end' : index === count - 1 ? 'The last end' : `Bend ${index} of ${count - 2}`;

/** The whole mark, or one point of it, moved by buttons. */
function MoveIt({ mark, onEdit }: Pick<Props, 'mark' | 'onEdit'>) {
  const [part, setPart] = useState('whole');
  const count = mark.points.length;
  const at = mark.points[Number(part)];
  const move = (dx: number, dy: number) =>
    onEdit(
      (now) => (at ? movePoint(now, Number(part), photoPoint(at.x + dx, at.y + dy)) : moveMark(now, dx, dy)),
      `move ${part}`,
    );
  return (
    <div role="group" aria-label="Move it" className="flex flex-wrap items-end gap-2">
      {count > 1 ? (
        <SelectField
          label="Move"
          value={at ? part : 'whole'}
          onChange={(event) => setPart(event.target.value)}
        >
          <option value="whole">The whole mark</option>
          {mark.points.map((_, index) => (
            <option key={index} value={index}>
              {partWords(index, count)}
            </option>
          ))}
        </SelectField>
      ) : null}
      {NUDGES.map(({ label, Icon, dx, dy }) => (
        <Button key={label} aria-label={`Move it ${label}`} onClick={() => move(dx, dy)}>
          <Icon aria-hidden size={20} />
        </Button>
      ))}
    </div>
  );
}
