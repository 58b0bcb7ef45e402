import type { TicketDto } from '@/db/queries/journals';

const STRENGTH = ['', 'faint', 'clear', 'pulling'] as const;
const some = (count: number, one: string, many: string) =>
  `${count === 1 ? 'one' : count} ${count === 1 ? one : many}`;

/** How a round hung, in a few words, from what was found on it. */
export function ticketWords(ticket: TicketDto): string {
  if (ticket.hangsClean) return 'hangs clean';
  if (ticket.signsSeen === 0) return ticket.photos === 0 ? 'waiting for photos' : 'waiting to be read';
  return `${some(ticket.signsSeen, 'sign', 'signs')}, up to ${STRENGTH[ticket.strongest] ?? 'pulling'}`;
}

export interface NextStep {
  words: string;
  path: 'rounds/new' | `rounds/${number}`;
}

/** The next thing to do on a garment. */
export function nextStep(last: TicketDto | undefined, isSettled: boolean): NextStep | null {
  if (isSettled) return null;
  if (!last) return { words: 'Begin round 1', path: 'rounds/new' };
  const here = `rounds/${last.number}` as const;
  if (last.photos === 0) return { words: 'Add photos', path: here };
  if (last.signsSeen === 0 && !last.hangsClean) return { words: 'Read it', path: here };
  if (last.hangsClean) return { words: 'Settle it', path: here };
  if (last.changesPlanned === 0) return { words: 'Choose a change', path: here };
  return { words: 'Sew the next round', path: 'rounds/new' };
}
