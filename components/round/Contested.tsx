'use client';
import { STRENGTHS } from '@/components/signs/SignRow';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { Knowledge } from '@/diagnosis/garments/schema';
import {
  type Acknowledged,
  contestedEntries,
  type Edit,
  editOf,
  type Entry,
  entryKey,
  type EvidenceState,
} from './evidence-state';

interface Props {
  state: EvidenceState;
  conflicts: Acknowledged['conflicts'];
  knowledge: Knowledge | null;
  onChoose: (edits: Edit[]) => void;
}

/** The other version as an edit. A test's amount is not in it: it is asked again. */
function theirEdit(entry: Entry, says: string): Edit {
  const { id, side } = entry;
  if (entry.kind === 'sign') return { kind: 'sign', id, side, value: Number(says) };
  if (entry.kind === 'cause') return { kind: 'cause', id, side, value: says === 'true' };
  return {
    kind: 'check',
    id,
    side,
    value: { outcome: says, amount: null, amountMm: null, basis: null, places: null },
  };
}

const saysWords = (kind: Entry['kind'], says: string) =>
  kind === 'sign'
    ? (STRENGTHS[Number(says)] ?? says)
    : kind === 'cause'
      ? says === 'true'
        ? 'it is that'
        : 'it is not that'
      : says;

/** The same thing said differently in two places: both are shown, the person chooses. */
export function Contested({ state, conflicts, knowledge, onChoose }: Props) {
  const contested = contestedEntries(state);
  if (contested.length === 0) return null;
  const nameOf = (id: string) =>
    [...(knowledge?.signs ?? []), ...(knowledge?.checks ?? []), ...(knowledge?.causes ?? [])].find(
      (one) => one.id === id,
    )?.name ?? id;
  return (
    <Notice tone="care" title="Said differently elsewhere" role="alert">
      <ul className="grid gap-3">
        {contested.map((entry) => {
          const theirs = conflicts.find((one) => entryKey(one) === entryKey(entry))?.theirs;
          return (
            <li key={entryKey(entry)} className="grid gap-2">
              <span>
                {nameOf(entry.id)}
                {theirs ? `: elsewhere “${saysWords(entry.kind, theirs.says)}”.` : ''}
              </span>
              <span className="flex flex-wrap gap-2">
                <Button onClick={() => onChoose([editOf(entry)])}>Keep what I said here</Button>
                {theirs ? (
                  <Button onClick={() => onChoose([theirEdit(entry, theirs.says)])}>Take the other</Button>
                ) : null}
              </span>
            </li>
          );
        })}
      </ul>
    </Notice>
  );
}
