'use client';
import { Trash2, X } from 'lucide-react';
import { ToggleGroup } from 'radix-ui';
import { FIELD } from '@/components/ui/styles';
import { changeKind, type Mark, MARK_KINDS, type MarkKind, type MarkSide } from './model/mark';
import { KIND_WORDS } from './model/mark-text';

interface Props {
  mark: Mark;
  onEdit: (edit: (mark: Mark) => Mark) => void;
  onDelete: () => void;
  onLetGo: () => void;
}

const SIDES: { value: MarkSide; label: string; short: string }[] = [
  { value: 'left', label: 'Your left', short: 'Left' },
  { value: 'both', label: 'Both legs', short: 'Both' },
  { value: 'right', label: 'Your right', short: 'Right' },
];

/** The chosen mark, in one line under the photo: what it is, on which leg, away with it. Its strength stands in the tools. */
export function MarkBar({ mark, onEdit, onDelete, onLetGo }: Props) {
  return (
    <div role="group" aria-label="The chosen mark" className="flex flex-wrap items-center gap-1 bg-paper p-1">
      <select
        aria-label="Kind of the chosen mark"
        className={`${FIELD} min-w-36 flex-1 md:max-w-48`}
        value={mark.kind}
        onChange={(event) => onEdit((now) => changeKind(now, event.target.value as MarkKind))}
      >
        {MARK_KINDS.map((kind) => (
          <option key={kind} value={kind}>
            {KIND_WORDS[kind]}
          </option>
        ))}
      </select>
      <button
        type="button"
        aria-label="Delete the chosen mark"
        onClick={onDelete}
        className="inline-flex size-11 items-center justify-center text-pin"
      >
        <Trash2 aria-hidden size={22} />
      </button>
      <button
        type="button"
        aria-label="Let the mark go"
        onClick={onLetGo}
        className="inline-flex size-11 items-center justify-center"
      >
        <X aria-hidden size={22} />
      </button>
      <ToggleGroup.Root
        type="single"
        value={mark.side}
        onValueChange={(side) => side && onEdit((now) => ({ ...now, side: side as MarkSide }))}
        aria-label="Leg of the chosen mark"
        className="flex flex-1 md:flex-none md:order-first"
      >
        {SIDES.map(({ value, label, short }) => (
          <ToggleGroup.Item
            key={value}
            value={value}
            aria-label={label}
            className="min-h-11 min-w-12 flex-1 rounded-md px-2 text-sm data-[state=on]:bg-ink data-[state=on]:text-cloth"
          >
            {short}
          </ToggleGroup.Item>
        ))}
      </ToggleGroup.Root>
    </div>
  );
}
