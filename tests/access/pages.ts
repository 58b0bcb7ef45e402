import { anySignedIn, everyone, only } from './roles';
import type { PageRow } from './row';

const page = (file: string, path: PageRow['path'], access: PageRow['access']): PageRow => ({ kind: 'page', file: `app/${file}/page.tsx`, path, access }); // prettier-ignore
const own = anySignedIn('sign-in');
const owner = only('sign-in', 'owner');
const readers = only('sign-in', 'owner', 'reader', 'fitter');

export const PAGE_ROWS: PageRow[] = [
  page('(public)', () => '/', everyone),
  page('(auth)/sign-in', () => '/sign-in', everyone),
  page('(auth)/sign-up', () => '/sign-up', everyone),
  page('(auth)/verify', () => '/verify', everyone),
  page('(auth)/forgot', () => '/forgot', everyone),
  page('(auth)/reset', () => '/reset', everyone),
  page('(auth)/invitation', ({ invitationToken }) => `/invitation?token=${invitationToken}`, everyone),
  page('(auth)/new-address', () => '/new-address', everyone),
  page('dev/mail', () => '/dev/mail', everyone), // there only on the one machine that RUCKLE_LOCAL names
  page('dev/parts', () => '/dev/parts', everyone), // the same
  page('(studio)/settings', () => '/settings', own),
  page('(studio)/settings/password', () => '/settings/password', own),
  page('(studio)/settings/address', () => '/settings/address', own),
  page('(studio)/settings/sessions', () => '/settings/sessions', own),
  page('(studio)/settings/leave', () => '/settings/leave', own),
  page('(studio)/bin', () => '/bin', own),
  page('(studio)/admin', () => '/admin', only('sign-in', 'admin')),
  page('(studio)/admin/troubles', () => '/admin/troubles', only('sign-in', 'admin')),
  page('(studio)/admin/audit', () => '/admin/audit', only('sign-in', 'admin')),
  page('(studio)/wearers', () => '/wearers', own),
  page('(studio)/wearers/new', () => '/wearers/new', own),
  page('(studio)/wearers/[wearerId]', ({ wearerId }) => `/wearers/${wearerId}`, owner),
  page('(studio)/wearers/[wearerId]/measure', ({ wearerId }) => `/wearers/${wearerId}/measure`, owner),
  page('(studio)/patterns', () => '/patterns', own),
  page('(studio)/patterns/new', () => '/patterns/new', own),
  page('(studio)/patterns/[patternId]', ({ patternId }) => `/patterns/${patternId}`, owner),
  page('(studio)/patterns/[patternId]/chart', ({ patternId }) => `/patterns/${patternId}/chart`, owner),
  page('(studio)/journals', () => '/journals', own),
  page('(studio)/journals/new', () => '/journals/new', own),
  page('(studio)/journals/[journalId]', ({ journalId }) => `/journals/${journalId}`, readers),
  page('(studio)/journals/[journalId]/cut', ({ journalId }) => `/journals/${journalId}/cut`, owner),
  page('(studio)/journals/[journalId]/cut/sheet', ({ journalId }) => `/journals/${journalId}/cut/sheet`, owner),
  page('(studio)/journals/[journalId]/compare', ({ journalId }) => `/journals/${journalId}/compare`, readers),
  page('(studio)/journals/[journalId]/record', ({ journalId }) => `/journals/${journalId}/record`, readers),
  page('(studio)/journals/[journalId]/share', ({ journalId }) => `/journals/${journalId}/share`, owner),
  page('(studio)/fittings', () => '/fittings', own),
  page('(studio)/journals/[journalId]/rounds/new', ({ journalId }) => `/journals/${journalId}/rounds/new`, owner),
  page('(studio)/journals/[journalId]/rounds/[number]', ({ journalId }) => `/journals/${journalId}/rounds/1`, readers),
]; // prettier-ignore
