import { anySignedIn, everyone } from './roles';
import type { ActionRow } from './row';

const action = (file: string, name: string, path: string, access = everyone): ActionRow => ({ kind: 'action', file: `app/${file}/actions.ts`, name, path: () => path, access }); // prettier-ignore

/** The account forms. They are for whoever has none or lost the way in; signing out is harmless to who is not signed in. */
export const ACTION_ROWS: ActionRow[] = [
  action('(auth)/sign-in', 'signIn', '/sign-in'),
  action('(auth)/sign-up', 'signUp', '/sign-up'),
  action('(auth)/verify', 'confirmAddress', '/verify'),
  action('(auth)/forgot', 'sendReset', '/forgot'),
  action('(auth)/reset', 'choosePassword', '/reset'),
  action('(auth)/new-address', 'confirmNewAddress', '/new-address'),
  action('(studio)/settings', 'signOut', '/settings'),
  action('(studio)/settings/password', 'setPassword', '/settings/password', anySignedIn('sign-in')),
  action('(studio)/settings/address', 'askForAddress', '/settings/address', anySignedIn('sign-in')),
  action('(studio)/settings/leave', 'closeAccount', '/settings/leave', anySignedIn('sign-in')),
];
