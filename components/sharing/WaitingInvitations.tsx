import { Section } from '@/components/ui/Section';
import type { InvitationDto } from '@/db/queries/invitations';
import { InvitationAnswers } from './InvitationAnswers';
import { invitationWords } from './sharing-words';

/** Invitations to one's own address that wait for an answer. */
export function WaitingInvitations({ invitations }: { invitations: InvitationDto[] }) {
  if (invitations.length === 0) return null;
  return (
    <Section title="Invitations">
      <ul className="grid gap-6">
        {invitations.map((invitation) => (
          <li key={invitation.id} className="grid gap-3">
            <p>{invitationWords(invitation)}</p>
            <InvitationAnswers url={`/api/invitations/${invitation.id}`} />
          </li>
        ))}
      </ul>
    </Section>
  );
}
