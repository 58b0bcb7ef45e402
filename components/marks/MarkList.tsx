'use client';
import { Plus } from 'lucide-react';
import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Disclosure } from '@/components/ui/Disclosure';
import { SelectField } from '@/components/ui/SelectField';
import { MarkEditor } from './MarkEditor';
import { type Mark, MARK_KINDS, type MarkKind, type PhotoPoint, photoPoint } from './model/mark';
import { KIND_WORDS, markText } from './model/mark-text';

interface Props {
  marks: Mark[];
  selected: string | null;
  onSelect: (id: string | null) => void;
  onAdd: (kind: MarkKind, points: PhotoPoint[]) => void;
  onEdit: (id: string, edit: (mark: Mark) => Mark, run?: string) => void;
  onDelete: (id: string) => void;
}

/** The marks of a photo in words. It does everything that drawing does. */
export function MarkList({ marks, selected, onSelect, onAdd, onEdit, onDelete }: Props) {
  return (
    <div className="grid gap-2">
      {marks.length === 0 ? (
        <p className="text-graphite">No mark on this photo yet. Draw along a line, or tap its points.</p>
      ) : null}
      <ul className="grid gap-1">
        {marks.map((mark) => (
          <li key={mark.id}>
            <button
              type="button"
              aria-expanded={mark.id === selected}
              onClick={() => onSelect(mark.id === selected ? null : mark.id)}
              className="min-h-11 w-full py-2 text-left underline decoration-seam underline-offset-4 hover:decoration-ink"
            >
              {markText(mark)}
            </button>
            {mark.id === selected ? (
              <MarkEditor
                mark={mark}
                onEdit={(edit, run) => onEdit(mark.id, edit, run)}
                onDelete={() => onDelete(mark.id)}
              />
            ) : null}
          </li>
        ))}
      </ul>
      <Disclosure summary="Add a mark without drawing">
        <AddByPlace onAdd={onAdd} />
      </Disclosure>
    </div>
  );
}

const ROWS = ['Top', 'Upper', 'Middle', 'Lower', 'Bottom'];
const COLUMNS = ['left edge', 'left', 'centre', 'right', 'right edge'];
const PLACES = ROWS.flatMap((row, y) =>
  COLUMNS.map((column, x) => ({
    label: `${row}, ${column}`,
    point: photoPoint(0.1 + x * 0.2, 0.1 + y * 0.2),
  })),
);

/** Two places on the photo, named; then the arrows of the mark do the rest. */
function AddByPlace({ onAdd }: Pick<Props, 'onAdd'>) {
  const [kind, setKind] = useState<MarkKind>('tight');
  const [from, setFrom] = useState(7);
  const [to, setTo] = useState(12);
  const place = (label: string, value: number, set: (value: number) => void) => (
    <SelectField label={label} value={value} onChange={(event) => set(Number(event.target.value))}>
      {PLACES.map(({ label: name }, i) => (
        <option key={name} value={i}>
          {name}
        </option>
      ))}
    </SelectField>
  );
  const add = () => {
    const ends = [PLACES[from]!.point, PLACES[to]!.point];
    onAdd(kind, kind === 'pin' ? ends.slice(0, 1) : ends);
  };
  return (
    <div className="grid gap-3 sm:grid-cols-3">
      <SelectField
        label="What it is"
        value={kind}
        onChange={(event) => setKind(event.target.value as MarkKind)}
      >
        {MARK_KINDS.map((one) => (
          <option key={one} value={one}>
            {KIND_WORDS[one]}
          </option>
        ))}
      </SelectField>
      {place('From', from, setFrom)}
      {place('To', to, setTo)}
      <div>
        <Button onClick={add} disabled={from === to && kind !== 'pin'}>
          <Plus aria-hidden size={20} />
          Add it
        </Button>
      </div>
    </div>
  );
}
