import Link from 'next/link';
import { SwingTicket } from '@/components/rail/SwingTicket';
import type { DeskRoundDto } from '@/db/queries/desk';

interface Props {
  journalId: string;
  rounds: DeskRoundDto[];
  number: number;
}

const BEGUN = { 'new-cloth': 'new cloth', 're-baste': 'basted again', patch: 'patched' } as const;

/** The rounds of the garment beside the one on the table. */
export function RoundsRail({ journalId, rounds, number }: Props) {
  return (
    <nav aria-label="Rounds" className="min-w-0">
      <ol className="flex gap-3 overflow-x-auto pb-2 lg:grid lg:overflow-visible">
        {rounds.map((round) => (
          <li key={round.id} className="shrink-0">
            <Link
              href={`/journals/${journalId}/rounds/${round.number}`}
              aria-current={round.number === number ? 'page' : undefined}
              className="block"
            >
              <SwingTicket number={round.number} date={round.wornOn} isHere={round.number === number}>
                {BEGUN[round.begun]}
              </SwingTicket>
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}
