import { v7 } from 'uuid';
import { anySignedIn, everyone, only } from './roles';
import type { HandlerRow } from './row';
import { smallJpeg } from './small-jpeg';

type Rest = Pick<HandlerRow, 'path' | 'access' | 'body' | 'hasFiles' | 'isInBin'>;
const handler = (method: HandlerRow['method'], file: string, rest: Rest): HandlerRow => ({
  kind: 'handler',
  method,
  file: `app/api/${file}/route.ts`,
  ...rest,
});

const own = anySignedIn('signed-out');
const owner = only('signed-out', 'owner');
const readers = only('signed-out', 'owner', 'reader', 'fitter');
const fitters = only('signed-out', 'owner', 'fitter');

const wearer = { name: 'Bea', isSelf: true, isUnder18: false, fittedFor: 'standing', wornBeneath: '', shape: [], consentsMeasure: false, consentsPhotograph: false, consentsShare: false, consentOn: null }; // prettier-ignore
const pattern = { name: 'Narrow legs', maker: '', clothKind: 'woven', stretchPercent: 0, notes: '' };
const preferences = { displayName: 'Bea', unit: 'in', words: 'us', hidesMeasurements: false, isFitter: false, isPatternMaker: false }; // prettier-ignore

const WEARERS = [
  handler('GET', 'wearers', { path: () => '/api/wearers', access: own }),
  handler('POST', 'wearers', { path: () => '/api/wearers', access: own, body: () => ({ id: v7(), wearer }) }),
  handler('PATCH', 'wearers/[wearerId]', {
    path: ({ wearerId }) => `/api/wearers/${wearerId}`,
    access: owner,
    body: () => ({ version: 1, wearer }),
  }),
  handler('DELETE', 'wearers/[wearerId]', {
    path: ({ wearerId }) => `/api/wearers/${wearerId}`,
    access: owner,
  }),
  handler('POST', 'wearers/[wearerId]/measurements', {
    path: ({ wearerId }) => `/api/wearers/${wearerId}/measurements`,
    access: owner,
    body: () => ({ id: v7(), measuredOn: '2026-01-02', takenAlone: true, waistPlace: 'navel', note: '', unit: 'cm', values: [{ measure: 'hip', typed: '102' }] }), // prettier-ignore
  }),
];

const PATTERNS = [
  handler('GET', 'patterns', { path: () => '/api/patterns', access: own }),
  handler('POST', 'patterns', { path: () => '/api/patterns', access: own, body: () => ({ id: v7(), pattern }) }),
  handler('PATCH', 'patterns/[patternId]', {
    path: ({ patternId }) => `/api/patterns/${patternId}`,
    access: owner,
    body: () => ({ version: 1, pattern }),
  }),
  handler('DELETE', 'patterns/[patternId]', { path: ({ patternId }) => `/api/patterns/${patternId}`, access: owner }),
]; // prettier-ignore

const BEFORE_THE_CUT = [
  handler('PUT', 'patterns/[patternId]/chart', {
    path: ({ patternId }) => `/api/patterns/${patternId}/chart`,
    access: owner,
    body: () => ({
      kind: 'body',
      unit: 'cm',
      pasted: 'Size\tHip\n10\t98\n12\t102',
      allowance: null,
      leavesOut: false,
    }),
  }),
  handler('PATCH', 'journals/[journalId]/cut', {
    path: ({ journalId }) => `/api/journals/${journalId}/cut`,
    access: owner,
    body: () => ({ version: 0, patternWaist: 'band', ease: { hip: { typed: '6 cm', unit: 'cm' } } }),
  }),
  handler('PUT', 'journals/[journalId]/fitted', {
    path: ({ journalId }) => `/api/journals/${journalId}/fitted`,
    access: owner,
    body: () => ({ unit: 'cm', measures: [{ measure: 'back-crotch-length', typed: '37,2' }] }),
  }),
  handler('POST', 'rounds/[roundId]/measured', {
    path: ({ roundId }) => `/api/rounds/${roundId}/measured`,
    access: owner,
    body: ({ journalId }) => ({ journalId }),
  }),
  handler('DELETE', 'measured/[measuredId]', {
    path: ({ measuredId }) => `/api/measured/${measuredId}`,
    access: owner,
  }),
];

const JOURNALS = [
  handler('GET', 'journals', { path: () => '/api/journals', access: own }),
  handler('POST', 'journals', {
    path: () => '/api/journals',
    access: owner, // for the owner's wearer and draft
    body: ({ wearerId, draftId }) => ({ id: v7(), name: 'Linen', wearerId, patternDraftId: draftId }),
  }),
  handler('PATCH', 'journals/[journalId]', {
    path: ({ journalId }) => `/api/journals/${journalId}`,
    access: owner,
    body: () => ({ version: 1, name: 'Other' }),
  }),
  handler('DELETE', 'journals/[journalId]', { path: ({ journalId }) => `/api/journals/${journalId}`, access: owner }),
  handler('POST', 'journals/[journalId]/rounds', {
    path: ({ journalId }) => `/api/journals/${journalId}/rounds`,
    access: owner,
    body: () => ({ id: v7(), begun: 're-baste', wornOn: null }),
  }),
]; // prettier-ignore

const ROUNDS = [
  handler('PATCH', 'rounds/[roundId]', {
    path: ({ roundId }) => `/api/rounds/${roundId}`,
    access: owner,
    body: () => ({ version: 1, note: 'Seen in daylight.' }),
  }),
  handler('DELETE', 'rounds/[roundId]', { path: ({ roundId }) => `/api/rounds/${roundId}`, access: owner }),
  handler('PUT', 'rounds/[roundId]/evidence', {
    path: ({ roundId }) => `/api/rounds/${roundId}/evidence`,
    access: fitters,
    body: () => ({ signs: [], checks: [], causes: [] }),
  }),
  handler('POST', 'rounds/[roundId]/changes', {
    path: ({ roundId }) => `/api/rounds/${roundId}/changes`,
    access: owner,
    body: () => ({ id: v7(), correction: 'other', side: 'both', basis: null, amount: null, reason: '' }),
  }),
  handler('PATCH', 'changes/[changeId]', {
    path: ({ changeId }) => `/api/changes/${changeId}`,
    access: owner,
    body: () => ({ version: 1, reason: 'Because.' }),
  }),
  handler('DELETE', 'changes/[changeId]', { path: ({ changeId }) => `/api/changes/${changeId}`, access: owner }),
]; // prettier-ignore

const PHOTOS = [
  handler('GET', 'rounds/[roundId]/photos', { path: ({ roundId }) => `/api/rounds/${roundId}/photos`, access: readers }),
  handler('POST', 'rounds/[roundId]/photos', { path: ({ roundId }) => `/api/rounds/${roundId}/photos?key=${v7()}&view=front`, access: owner, body: smallJpeg }),
  handler('GET', 'photos/[photoId]/[variant]', {
    path: ({ photoId }) => `/api/photos/${photoId}/640?r=1`,
    access: only('missing', 'owner', 'reader', 'fitter'),
    hasFiles: true,
  }),
  handler('PATCH', 'photos/[photoId]', {
    path: ({ photoId }) => `/api/photos/${photoId}`,
    access: owner,
    body: () => ({ version: 1, isMirrored: true }),
  }),
  handler('DELETE', 'photos/[photoId]', { path: ({ photoId }) => `/api/photos/${photoId}`, access: owner }),
  handler('POST', 'photos/[photoId]/restore', { path: ({ photoId }) => `/api/photos/${photoId}/restore`, access: owner, isInBin: true }),
  handler('GET', 'photos/[photoId]/marks', { path: ({ photoId }) => `/api/photos/${photoId}/marks`, access: readers }),
  handler('POST', 'photos/[photoId]/marks', {
    path: ({ photoId }) => `/api/photos/${photoId}/marks`,
    access: fitters,
    body: () => ({ revision: 1, upserts: [], deletes: [] }),
  }),
  handler('GET', 'photos/[photoId]/landmarks', { path: ({ photoId }) => `/api/photos/${photoId}/landmarks`, access: readers }),
  handler('PUT', 'photos/[photoId]/landmarks', {
    path: ({ photoId }) => `/api/photos/${photoId}/landmarks`,
    access: fitters,
    body: () => ({ revision: 1, seen: 0, landmarks: [] }),
  }),
]; // prettier-ignore

const NOWHERE = (['GET', 'POST', 'PUT', 'PATCH', 'DELETE'] as const).map((method) =>
  handler(method, '[...rest]', { path: () => '/api/no/such/address', access: only('signed-out') }),
);

const invited = only('signed-out', 'other');
const invitation = (email: string) => ({ id: v7(), email, level: 'read', expiresInDays: 30 });

const SHARING = [
  handler('POST', 'journals/[journalId]/grants', { path: ({ journalId }) => `/api/journals/${journalId}/grants`, access: owner, body: () => invitation(`${v7()}@example.org`) }),
  handler('POST', 'rounds/[roundId]/grants', { path: ({ roundId }) => `/api/rounds/${roundId}/grants`, access: owner, body: () => invitation(`${v7()}@example.org`) }),
  handler('DELETE', 'grants/[grantId]', { path: ({ grantId }) => `/api/grants/${grantId}`, access: owner }),
  handler('POST', 'grants/[grantId]/resend', { path: ({ invitationId }) => `/api/grants/${invitationId}/resend`, access: owner }),
  handler('POST', 'invitations', { path: () => '/api/invitations', access: invited, body: ({ invitationToken }) => ({ token: invitationToken, answer: 'accept' }) }),
  handler('POST', 'invitations/[grantId]', { path: ({ invitationId }) => `/api/invitations/${invitationId}`, access: invited, body: () => ({ answer: 'block' }) }),
  handler('POST', 'journals/[journalId]/leave', { path: ({ journalId }) => `/api/journals/${journalId}/leave`, access: only('signed-out', 'reader', 'fitter', 'pattern maker') }),
]; // prettier-ignore

const change = () => ({ id: v7(), correction: 'other', side: 'both', basis: null, amount: null, reason: '' });

const CONVERSATION = [
  handler('GET', 'rounds/[roundId]/conversation', { path: ({ roundId }) => `/api/rounds/${roundId}/conversation`, access: readers }),
  handler('POST', 'rounds/[roundId]/comments', { path: ({ roundId }) => `/api/rounds/${roundId}/comments`, access: fitters, body: () => ({ id: v7(), body: 'Look at the knee.', place: null, sign: null, asksCheck: null }) }),
  handler('PATCH', 'comments/[commentId]', { path: ({ commentId }) => `/api/comments/${commentId}`, access: owner, body: () => ({ version: 1, body: 'The right leg?' }) }),
  handler('DELETE', 'comments/[commentId]', { path: ({ commentId }) => `/api/comments/${commentId}`, access: owner }),
  handler('POST', 'rounds/[roundId]/proposals', { path: ({ roundId }) => `/api/rounds/${roundId}/proposals`, access: fitters, body: () => ({ id: v7(), reason: 'Because.', changes: [change()] }) }),
  handler('POST', 'proposals/[proposalId]/answer', { path: ({ proposalId }) => `/api/proposals/${proposalId}/answer`, access: owner, body: () => ({ taken: [] }) }),
]; // prettier-ignore

export const HANDLER_ROWS: HandlerRow[] = [
  ...NOWHERE,
  handler('GET', 'health', { path: () => '/api/health', access: everyone }),
  handler('PATCH', 'me', { path: () => '/api/me', access: own, body: () => preferences }),
  ...WEARERS,
  ...PATTERNS,
  ...BEFORE_THE_CUT,
  ...JOURNALS,
  ...ROUNDS,
  ...PHOTOS,
  ...SHARING,
  ...CONVERSATION,
  handler('PATCH', 'admin/users/[userId]', { path: ({ testerId }) => `/api/admin/users/${testerId}`, access: only('signed-out', 'admin'), body: () => ({ isAdmin: false }) }), // prettier-ignore
  // Each role has one session in its world, so that there is no other to end.
  handler('DELETE', 'sessions/[which]', { path: () => '/api/sessions/others', access: only('signed-out') }),
  handler('POST', 'bin/[kind]/[id]/restore', {
    path: ({ photoId }) => `/api/bin/photo/${photoId}/restore`,
    access: owner,
    isInBin: true,
  }),
];
