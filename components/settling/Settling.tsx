import { sideWords } from '@/components/reading/words';
import type { JournalSettling } from './journal-settling';
import { Ridges } from './Ridges';

/** How each need settles from round to round: left too much cloth, right too little, the middle fits. */
export function Settling({ rows, rounds }: JournalSettling) {
  if (rows.length === 0)
    return (
      <p className="max-w-prose text-graphite">
        Nothing to settle yet. Once a round says that something is possible, it is drawn here, round under
        round.
      </p>
    );
  return (
    <>
      <p className="max-w-prose text-sm text-graphite">
        Left of the middle: too much cloth. Right: the pattern needs more. A wide ridge means: not sure yet.
        In the band it fits.
      </p>
      <ul className="grid gap-x-10 gap-y-8 lg:grid-cols-2">
        {rows.map((row) => (
          <li key={`${row.dimension} ${row.side}`} className="grid gap-2">
            <h3 className="font-bold">
              {row.name}
              {sideWords(row.side)}
            </h3>
            <Ridges row={row} />
            <ol className="grid gap-0.5 text-sm text-graphite">
              {row.rounds.map(({ word, says }, i) => (
                <li key={rounds[i]}>
                  Round {rounds[i]}: {says ? `${word}, ${says}` : 'it fits, as far as this round says'}
                </li>
              ))}
            </ol>
          </li>
        ))}
      </ul>
    </>
  );
}
