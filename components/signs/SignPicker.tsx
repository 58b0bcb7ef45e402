'use client';
import { useMemo, useState } from 'react';
import {
  type Edit,
  type Entry,
  entryKey,
  type EvidenceState,
  type Side,
} from '@/components/round/evidence-state';
import { SIDE_OPTIONS } from '@/components/round/side-options';
import { Button } from '@/components/ui/Button';
import { TextField } from '@/components/ui/TextField';
import type { Knowledge, Sign, View } from '@/diagnosis/garments/schema';
import { findSigns } from '@/diagnosis/words/search';
import { SignRow } from './SignRow';
import { groupByZone, ZONE_WORDS } from './zones';

interface Props {
  knowledge: Knowledge;
  view: View;
  cut: 'full' | 'shorts';
  state: EvidenceState;
  onEdit: (edits: Edit[]) => void;
}

const FOUND_MAX = 7;

/** The state of a sign, on whichever side it was set. */
function entryOf(state: EvidenceState, sign: Sign): (Entry & { kind: 'sign' }) | null {
  for (const { value: side } of SIDE_OPTIONS) {
    const entry = state.entries[entryKey({ kind: 'sign', id: sign.id, side })];
    if (entry?.kind === 'sign' && entry.value !== null) return entry;
  }
  return null;
}

/** Setting it on another side takes it back on the one before. */
function editsFor(state: EvidenceState, sign: Sign, value: number | null, side: Side): Edit[] {
  const had = entryOf(state, sign);
  const edits: Edit[] = [{ kind: 'sign', id: sign.id, side, value }];
  if (had && had.side !== side) edits.push({ kind: 'sign', id: sign.id, side: had.side, value: null });
  return edits;
}

/** What this view shows: by place from the waist down, or found by everyday words. */
export function SignPicker({ knowledge, view, cut, state, onEdit }: Props) {
  const [words, setWords] = useState('');
  const groups = useMemo(() => groupByZone(knowledge.signs, view, cut), [knowledge, view, cut]);
  const found = useMemo(() => findByWords(knowledge, words), [knowledge, words]);
  const row = (sign: Sign) => {
    const entry = entryOf(state, sign);
    return (
      <SignRow
        key={sign.id}
        sign={sign}
        severity={entry?.value ?? null}
        side={entry?.side ?? 'both'}
        onChange={(value, side) => onEdit(editsFor(state, sign, value, side))}
      />
    );
  };
  const unseen = groups.flatMap((group) => group.signs).filter((sign) => !entryOf(state, sign));
  return (
    <div className="grid gap-4">
      <TextField
        type="search"
        label="Find it by words"
        hint="As you would say it: “pulls into my thighs”, “gapes at the back”."
        autoComplete="off"
        value={words}
        onChange={(event) => setWords(event.target.value)}
      />
      {words.trim() ? (
        <div aria-live="polite">
          {found.length === 0 ? (
            <p>No sign is found by these words. Try the place, or how the line runs.</p>
          ) : (
            found.map(row)
          )}
        </div>
      ) : (
        groups.map(({ zone, signs }) => {
          const seen = signs.filter((sign) => entryOf(state, sign)).length;
          return (
            <details key={zone} className="border-t border-seam">
              <summary className="flex min-h-11 items-center justify-between gap-3 py-2 font-bold">
                <span>{ZONE_WORDS[zone]}</span>
                <span className="text-sm font-normal text-graphite">
                  {seen} of {signs.length} looked at
                </span>
              </summary>
              {signs.map(row)}
            </details>
          );
        })
      )}
      {unseen.length > 0 && !words.trim() ? (
        <div className="grid justify-items-start gap-1">
          <Button
            onClick={() =>
              onEdit(unseen.map((sign) => ({ kind: 'sign', id: sign.id, side: 'both', value: 0 })))
            }
          >
            Looked at everything in this view
          </Button>
          <p className="text-sm text-graphite">
            Writes “looked, not there” for the {unseen.length === 1 ? 'one' : unseen.length} not yet said.
          </p>
        </div>
      ) : null}
    </div>
  );
}

function findByWords(knowledge: Knowledge, words: string): Sign[] {
  if (words.trim() === '') return [];
  const byId = new Map(knowledge.signs.map((sign) => [sign.id, sign]));
  return findSigns(knowledge, words)
    .slice(0, FOUND_MAX)
    .flatMap(({ sign }) => byId.get(sign) ?? []);
}
