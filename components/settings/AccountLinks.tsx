import { PlainList } from '@/components/ui/PlainList';

const LINKS = [
  { id: 'password', href: '/settings/password', title: 'Choose another password', note: '' },
  { id: 'address', href: '/settings/address', title: 'Change your address', note: '' },
  { id: 'sessions', href: '/settings/sessions', title: 'Where you are signed in', note: 'End what you do not know' },
  { id: 'bin', href: '/bin', title: 'Put away', note: 'What you removed, to be brought back' },
  { id: 'leave', href: '/settings/leave', title: 'Close your account', note: 'With 14 days to come back' },
] as const; // prettier-ignore

const ADMIN = { id: 'admin', href: '/admin', title: 'Run the site', note: 'Accounts, letters, audit' } as const; // prettier-ignore

/** Ways to what concerns one's own account, and for an admin to the site's. */
export const AccountLinks = ({ isAdmin }: { isAdmin: boolean }) => (
  <PlainList items={isAdmin ? [...LINKS, ADMIN] : [...LINKS]} />
);
