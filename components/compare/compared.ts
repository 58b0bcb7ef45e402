import { ledgerRows, type LedgerRow } from '@/components/journal/ledger-rows';
import type { DeskDto, DeskRoundDto } from '@/db/queries/desk';
import { compareRounds, type ComparedSign } from '@/diagnosis/compare-rounds';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import type { View } from '@/diagnosis/garments/schema';

export interface Compared {
  signs: (ComparedSign & { name: string })[];
  changes: LedgerRow[];
}

/** A sign as the round keeps it: a fitter's state before the owner's. */
const statesOf = (round: DeskRoundDto) => {
  const states = new Map<
    string,
    { sign: string; side: 'left' | 'right' | 'both'; severity: number; isOwner: boolean }
  >();
  for (const state of round.signs) {
    const had = states.get(`${state.sign} ${state.side}`);
    if (!had || had.isOwner) states.set(`${state.sign} ${state.side}`, state);
  }
  return [...states.values()];
};

/**
 * Two rounds of a journal: what became of each sign, and what was really changed between them.
 * @param viewsAfter the views that were photographed in the later round
 */
export function comparedRounds(
  desk: DeskDto,
  before: DeskRoundDto,
  after: DeskRoundDto,
  viewsAfter: readonly View[],
): Compared {
  const knowledge = knowledgeOf(desk.garment);
  const signs = new Map(knowledge.signs.map((sign) => [sign.id, sign]));
  const compared = compareRounds(
    { signs: statesOf(before) },
    { signs: statesOf(after), views: viewsAfter },
    (id) => signs.get(id)?.views ?? [],
  );
  const between = desk.rounds.filter(({ number }) => number >= before.number && number < after.number);
  return {
    signs: compared.map((one) => ({ ...one, name: signs.get(one.sign)?.name ?? one.sign })),
    changes: ledgerRows(desk.garment, between).filter(({ isMade }) => isMade),
  };
}
