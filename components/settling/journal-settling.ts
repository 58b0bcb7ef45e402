import type { DeskDto } from '@/db/queries/desk';
import { parseCase } from '@/diagnosis/case';
import { caseFromRounds } from '@/diagnosis/case-from-rounds';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import { settlingOf, type SettlingRow } from '@/diagnosis/settling';

export interface JournalSettling {
  rows: SettlingRow[];
  /** Numbers of the rounds, in the order of the rows' rounds. */
  rounds: number[];
}

/** The settling of a journal as it stands: each round read with those before it. */
export function journalSettling(desk: DeskDto | null): JournalSettling {
  if (!desk) return { rows: [], rounds: [] };
  const knowledge = knowledgeOf(desk.garment);
  const read = desk.rounds.flatMap((round, at) => {
    const parsed = parseCase(knowledge, caseFromRounds(desk.garment, desk, desk.rounds.slice(0, at + 1)));
    return parsed.ok ? [{ number: round.number, fitting: parsed.value }] : [];
  });
  return {
    rows: settlingOf(
      knowledge,
      read.map(({ fitting }) => fitting),
    ),
    rounds: read.map(({ number }) => number),
  };
}
