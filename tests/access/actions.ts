import { everyone } from './roles';
import type { ActionRow } from './row';

const action = (file: string, name: string, path: string): ActionRow => ({ kind: 'action', file: `app/${file}/actions.ts`, name, path: () => path, access: everyone }); // prettier-ignore

/** The account forms. They are for whoever has none or lost the way in; signing out is harmless to who is not signed in. */
export const ACTION_ROWS: ActionRow[] = [
  action('(auth)/sign-in', 'signIn', '/sign-in'),
  action('(auth)/sign-up', 'signUp', '/sign-up'),
  action('(auth)/verify', 'confirmAddress', '/verify'),
  action('(auth)/forgot', 'sendReset', '/forgot'),
  action('(auth)/reset', 'choosePassword', '/reset'),
  action('(studio)/settings', 'signOut', '/settings'),
];
