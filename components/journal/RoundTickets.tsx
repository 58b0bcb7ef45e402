import Link from 'next/link';
import { PhotoImage } from '@/components/photos/PhotoImage';
import { SwingTicket } from '@/components/rail/SwingTicket';
import { ticketWords } from '@/components/rail/ticket-words';
import type { TicketDto } from '@/db/queries/journals';

interface Props {
  journalId: string;
  tickets: TicketDto[];
}

/** The rounds of a journal in order, each with its first photo and its ticket. */
export function RoundTickets({ journalId, tickets }: Props) {
  return (
    <ol className="grid grid-cols-2 gap-4 md:grid-cols-3 lg:grid-cols-5">
      {tickets.map((ticket) => (
        <li key={ticket.number}>
          <Link href={`/journals/${journalId}/rounds/${ticket.number}`} className="grid gap-2">
            <span className="block aspect-[3/4] overflow-hidden bg-weave">
              {ticket.coverPhotoId && ticket.coverRevision !== null ? (
                <PhotoImage
                  photoId={ticket.coverPhotoId}
                  revision={ticket.coverRevision}
                  alt=""
                  sizes="(min-width: 64rem) 18rem, 45vw"
                  fit="cover"
                />
              ) : (
                <span className="grid h-full place-items-center text-sm text-graphite">No photo</span>
              )}
            </span>
            <SwingTicket number={ticket.number} date={ticket.wornOn}>
              {ticketWords(ticket)}
              {ticket.changesBefore > 0
                ? ` · after ${ticket.changesBefore === 1 ? 'one change' : `${ticket.changesBefore} changes`}`
                : ''}
            </SwingTicket>
          </Link>
        </li>
      ))}
    </ol>
  );
}
