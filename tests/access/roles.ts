/**
 * Everyone who may stand before an address: nobody signed in, the one whose things they are, somebody else, those invited to
 * read or to fit, those who were once, and the people with a flag, which shows pages and opens nobody's things.
 */
export const ROLES = [
  'anonymous',
  'owner',
  'other',
  'reader',
  'fitter',
  'revoked',
  'expired',
  'pattern maker',
  'tester',
  'admin',
] as const;
export type Role = (typeof ROLES)[number];

/** `open`: it is answered. `sign-in`: sent to sign in. `signed-out`: 401. `missing`: 404, as for what does not exist. */
export type Answer = 'open' | 'sign-in' | 'signed-out' | 'missing';
export type Access = Record<Role, Answer>;

const each = (answer: (role: Role) => Answer): Access =>
  Object.fromEntries(ROLES.map((role) => [role, answer(role)])) as Access;

/** What a signed-out visitor gets: pages lead to signing in, handlers say 401, photos are not there. */
type SignedOut = Exclude<Answer, 'open'>;

export const everyone = each(() => 'open');
/** Lists, forms and settings: everyone has their own. */
export const anySignedIn = (signedOut: SignedOut) =>
  each((role) => (role === 'anonymous' ? signedOut : 'open'));
export const only = (signedOut: SignedOut, ...allowed: Role[]) =>
  each((role) => (role === 'anonymous' ? signedOut : allowed.includes(role) ? 'open' : 'missing'));
