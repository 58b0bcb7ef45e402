import { nextStep } from '@/components/rail/ticket-words';
import { LinkButton } from '@/components/ui/LinkButton';
import type { JournalDto } from '@/db/queries/journals';
import { SettleButton } from './SettleButton';

/** What one can do with a garment now: the next step first, then side by side once there are two rounds. */
export function JournalActions({ journal }: { journal: JournalDto }) {
  const { id, tickets, settledAt } = journal;
  const last = tickets.at(-1);
  const before = tickets.at(-2);
  const step = journal.isOwner ? nextStep(last, settledAt !== null) : null;
  return (
    <>
      {journal.isOwner ? <LinkButton href={`/journals/${id}/cut`}>Before the first cut</LinkButton> : null}
      {last && before ? (
        <LinkButton href={`/journals/${id}/compare?a=${before.number}&b=${last.number}`}>
          Side by side
        </LinkButton>
      ) : null}
      {journal.isOwner ? <LinkButton href={`/journals/${id}/share`}>Who may look</LinkButton> : null}
      {journal.isOwner && (last?.hangsClean || settledAt) ? (
        <SettleButton journalId={id} version={journal.version} isSettled={settledAt !== null} />
      ) : step ? (
        <LinkButton look="chalk" href={`/journals/${id}/${step.path}`}>
          {step.words}
        </LinkButton>
      ) : null}
    </>
  );
}
