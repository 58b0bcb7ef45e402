import 'server-only';

/** Stands in a letter until it is sent; only then is the secret of its link made. */
export const LINK_SECRET = '%link-secret%';

export interface MailBody {
  subject: string;
  textBody: string;
  htmlBody: string;
}

const escape = (text: string) =>
  text.replace(
    /[&<>"']/g,
    (c) => ({ '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;', "'": '&#39;' })[c] ?? c,
  );

/** A letter of a few sentences and at most one link. Subjects say that something waits, never what of a body it is about. */
function letter(
  subject: string,
  paragraphs: string[],
  link: { words: string; href: string },
  close = 'If this was not you, nothing has happened and you can leave it.',
): MailBody {
  const lines = [...paragraphs, `${link.words}:\n${link.href}`, close];
  const html = [
    ...paragraphs.map((text) => `<p>${escape(text)}</p>`),
    `<p><a href="${escape(link.href)}">${escape(link.words)}</a></p>`,
    `<p>${escape(close)}</p>`,
  ].join('\n');
  return {
    subject,
    textBody: lines.join('\n\n'),
    htmlBody: `<!doctype html><html lang="en"><body>${html}</body></html>`,
  };
}

export const verifyLetter = (origin: string): MailBody =>
  letter(
    'Confirm your address for Ruckle',
    ['Open this page and press the button to confirm your address. The link holds for 24 hours.'],
    {
      words: 'Confirm my address',
      href: `${origin}/verify?token=${LINK_SECRET}`,
    },
  );

export const resetLetter = (origin: string): MailBody =>
  letter(
    'Choose a new password for Ruckle',
    ['Open this page to choose a new password. The link holds for 30 minutes.'],
    {
      words: 'Choose a new password',
      href: `${origin}/reset?token=${LINK_SECRET}`,
    },
  );

export const alreadyLetter = (origin: string): MailBody =>
  letter(
    'You already have a Ruckle account',
    [
      'Somebody, perhaps you, tried to sign up with this address. It has an account already: sign in, or choose a new password there.',
    ],
    {
      words: 'Sign in',
      href: `${origin}/sign-in`,
    },
  );

export const passwordChangedLetter = (origin: string): MailBody =>
  letter(
    'Your Ruckle password was changed',
    ['Your password was changed just now, and every other session was ended.'],
    { words: 'Choose another password', href: `${origin}/forgot` },
    'If this was not you, choose another password at once: only this mailbox can.',
  );

const NAME_MAX = 40;

/** A name that someone chose for themselves, as part of one line of a letter: no line breaks, no control characters, not long. */
const nameInLine = (name: string): string =>
  name
    .replace(/[\p{Cc}\p{Cf}\p{Zl}\p{Zp}]+/gu, ' ')
    .trim()
    .slice(0, NAME_MAX) || 'Somebody';

export const invitationLetter = (origin: string, inviterName: string): MailBody =>
  letter(
    `${nameInLine(inviterName)} asks for your eye`,
    [
      `${nameInLine(inviterName)} keeps a sewing journal in Ruckle and would like you to look at part of it. The page says how far they open it to you, and lets you say no. You need an account with this address.`,
    ],
    { words: 'See the invitation', href: `${origin}/invitation?token=${LINK_SECRET}` },
    'If you do not know them, leave it: nothing is opened to anyone until you say yes.',
  );

export const changeEmailLetter = (origin: string): MailBody =>
  letter(
    'Confirm your new address for Ruckle',
    [
      'Open this page and press the button to make this the address of your account. The link holds for 24 hours.',
    ],
    { words: 'Use this address', href: `${origin}/new-address?token=${LINK_SECRET}` },
  );

export const emailChangedLetter = (origin: string): MailBody =>
  letter(
    'The address of your Ruckle account was changed',
    ['Your account goes by another address from now on, and every session was ended.'],
    { words: 'Open Ruckle', href: `${origin}/sign-in` },
    'If this was not you, write to whoever runs this site at once.',
  );

export const accountLeavingLetter = (origin: string): MailBody =>
  letter(
    'Your Ruckle account is closed',
    [
      'Your account and everything in it is out of sight from now on, and is erased in 14 days. Signing in before then takes it up again.',
    ],
    { words: 'Take it up again', href: `${origin}/sign-in` },
    'If this was not you, sign in and choose another password at once.',
  );
