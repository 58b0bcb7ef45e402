import type { InvitationDto } from '@/db/queries/invitations';
import type { GrantDto } from '@/db/queries/sharing';

/** One calendar for server and browser, so that both write the same. */
const DAY = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});
const MINUTE = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'long',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});
export const dayWords = (moment: Date | string): string => DAY.format(new Date(moment));
const minuteWords = (moment: Date | string): string => `${MINUTE.format(new Date(moment))} (UTC)`;

export const LEVEL_WORDS = {
  read: 'look',
  fit: 'look, mark and propose',
  'share-to-test': 'take part in a test',
} as const;

export function invitationWords({ inviterName, level, isOneRound, expiresAt }: InvitationDto): string {
  const until = expiresAt ? `, until ${dayWords(expiresAt)}` : '';
  return `${inviterName} opens ${isOneRound ? 'one round of a journal' : 'a journal'} to you, to ${LEVEL_WORDS[level]}${until}.`;
}

const STATE_WORDS = {
  waiting: 'not answered yet',
  open: 'open to them',
  'ran-out': 'has run out',
  'taken-back': 'taken back',
  declined: 'declined, or given back',
} as const;

/** How far, until when, what became of it, when they last looked. */
export function grantWords({ level, roundNumber, state, expiresAt, lastLookedAt }: GrantDto): string {
  const what = roundNumber === null ? 'the whole journal' : `round ${roundNumber}`;
  const until = state === 'open' || state === 'waiting' ? (expiresAt ? `until ${dayWords(expiresAt)}` : 'without an end') : ''; // prettier-ignore
  const looked = lastLookedAt ? `last looked ${minuteWords(lastLookedAt)}` : 'has not looked yet';
  return [`${what}, to ${LEVEL_WORDS[level]}`, STATE_WORDS[state], until, looked].filter(Boolean).join('; ');
}
