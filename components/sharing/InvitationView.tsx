import type { Route } from 'next';
import { LinkButton } from '@/components/ui/LinkButton';
import { Notice } from '@/components/ui/Notice';
import type { InvitationDto } from '@/db/queries/invitations';
import { InvitationAnswers } from './InvitationAnswers';
import { invitationWords } from './sharing-words';

interface Props {
  token: string;
  invitation: InvitationDto | null;
  /** Of whoever is signed in. */
  email: string | null;
}

/** Who invites to what, and nothing of it. Opening this page takes nothing up: scanners of mail open links too. */
export function InvitationView({ token, invitation, email }: Props) {
  if (!invitation)
    return (
      <Notice tone="care">
        This invitation was answered already, was taken back, or has run out. Ask whoever sent it for another.
        If you are invited, it also waits under “Asked for your eye” once you are signed in.
      </Notice>
    );
  return (
    <div className="grid gap-5">
      <p>{invitationWords(invitation)}</p>
      {email ? (
        <>
          <p>You are signed in as {email}. Only the address the letter went to can take it up.</p>
          <InvitationAnswers url="/api/invitations" extra={{ token }} />
        </>
      ) : (
        <>
          <p>Sign in with the address the letter went to. Until then nothing is opened.</p>
          <div className="flex flex-wrap gap-3">
            <LinkButton
              look="chalk"
              href={`/sign-in?next=${encodeURIComponent(`/invitation?token=${token}`)}` as Route}
            >
              Sign in
            </LinkButton>
            <LinkButton href="/sign-up">Make an account</LinkButton>
          </div>
        </>
      )}
    </div>
  );
}
