import Link from 'next/link';
import { PhotoImage } from '@/components/photos/PhotoImage';
import type { RailJournalDto } from '@/db/queries/journals';
import { SwingTicket } from './SwingTicket';
import { nextStep, ticketWords } from './ticket-words';

/** Garments in work, hung in a row from one rail: each with its last round as a swing ticket and the next thing to do. */
export function Rail({ journals }: { journals: RailJournalDto[] }) {
  return (
    <ul className="grid gap-x-6 gap-y-10 sm:grid-cols-2 lg:grid-cols-3 2xl:grid-cols-4">
      {journals.map((journal) => (
        <Garment key={journal.id} journal={journal} />
      ))}
    </ul>
  );
}

function Hook() {
  return (
    <span aria-hidden className="block h-9 border-t-4 border-ink">
      <svg
        viewBox="0 0 60 36"
        className="mx-auto h-9 text-ink"
        fill="none"
        stroke="currentColor"
        strokeWidth="2.5"
        strokeLinecap="round"
      >
        <path d="M30 22c0-5 6-5 6-11a6 6 0 0 0-12 0" />
        <path d="M30 22 4 35M30 22l26 13" />
      </svg>
    </span>
  );
}

function Garment({ journal }: { journal: RailJournalDto }) {
  const last = journal.tickets[0];
  const step = nextStep(last, journal.settledAt !== null);
  return (
    <li className="grid content-start">
      <Hook />
      <div className="grid gap-3 px-3">
        <Link href={`/journals/${journal.id}`} className="group grid gap-3">
          <span className="block aspect-[4/5] overflow-hidden bg-weave">
            {last?.coverPhotoId && last.coverRevision !== null ? (
              <PhotoImage
                photoId={last.coverPhotoId}
                revision={last.coverRevision}
                alt=""
                sizes="(min-width: 64rem) 20rem, 90vw"
                fit="cover"
              />
            ) : (
              <span className="grid h-full place-items-center text-graphite">No photo yet</span>
            )}
          </span>
          <span className="grid">
            <span className="text-lg font-bold [overflow-wrap:anywhere] group-hover:underline">
              {journal.name}
            </span>
            <span className="text-sm text-graphite [overflow-wrap:anywhere]">
              for {journal.wearerName} · {journal.patternName}
            </span>
          </span>
          {last ? (
            <SwingTicket number={last.number} date={last.wornOn}>
              {journal.settledAt ? 'settled' : ticketWords(last)}
            </SwingTicket>
          ) : null}
        </Link>
        {step ? (
          <Link
            href={`/journals/${journal.id}/${step.path}`}
            className="inline-flex min-h-11 items-center font-bold text-chalk underline decoration-2 underline-offset-4"
          >
            {step.words}
            <span className="sr-only"> for {journal.name}</span>
          </Link>
        ) : null}
      </div>
    </li>
  );
}
