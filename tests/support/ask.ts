import { randomUUID } from 'node:crypto';
import type { Answer, Role } from '../access/roles';
import type { ActionRow, HandlerRow, PageRow } from '../access/row';
import type { World } from '../access/world';

type Ids = Omit<World, 'sessions'>;

export interface Answered {
  status: number;
  location: string | null;
  body: string;
  headers: Headers;
}

export const ORIGIN = process.env.BASE_URL ?? '';

/** One request as a browser with this session would send it; redirects are not followed. */
export async function ask(path: string, session: string | null, init: RequestInit = {}): Promise<Answered> {
  const headers = new Headers(init.headers);
  if (session) headers.set('cookie', `session=${session}`);
  if (init.method && init.method !== 'GET') headers.set('origin', ORIGIN);
  const response = await fetch(new URL(`${ORIGIN}${path}`), { ...init, headers, redirect: 'manual' });
  const body = await response.text();
  return {
    status: response.status,
    location: response.headers.get('location'),
    body,
    headers: response.headers,
  };
}

export const askPage = (row: PageRow, ids: Ids, session: string | null) => ask(row.path(ids), session);

export async function askHandler(row: HandlerRow, ids: Ids, session: string | null): Promise<Answered> {
  const body: unknown = await row.body?.(ids);
  if (body === undefined) return ask(row.path(ids), session, { method: row.method });
  const isBytes = Buffer.isBuffer(body);
  return ask(row.path(ids), session, {
    method: row.method,
    headers: { 'content-type': isBytes ? 'image/jpeg' : 'application/json' },
    body: isBytes ? new Uint8Array(body) : JSON.stringify(body),
  });
}

/** Sends the form that stands on the page, empty, as a browser without JavaScript would. `source` is who sees that page. */
export async function askAction(
  row: ActionRow,
  source: string | null,
  session: string | null,
): Promise<Answered> {
  const path = row.path({} as Ids);
  const page = await ask(path, source);
  const form = new FormData();
  for (const [tag] of page.body.matchAll(/<input type="hidden" name="\$ACTION[^>]*>/g)) {
    const read = (name: string) =>
      new RegExp(` ${name}="([^"]*)"`).exec(tag)?.[1]?.replaceAll('&quot;', '"') ?? '';
    form.set(read('name'), read('value'));
  }
  if ([...form].length === 0) throw new Error(`no form was found on ${path}`);
  return ask(path, session, { method: 'POST', body: form });
}

export function answerOf({ status, location }: Answered): Answer | `unexpected ${number}` {
  if (location?.includes('/sign-in?next=')) return 'sign-in';
  if (status === 401) return 'signed-out';
  if (status === 404) return 'missing';
  return status < 400 ? 'open' : `unexpected ${status}`;
}

/** What may differ between a foreign thing and a missing one: its id, the nonce, and what the server counts up. */
export function withoutIds(body: string, ids: object): string {
  const known = Object.values(ids).filter((value) => typeof value === 'string');
  const nonce = /nonce="([^"]+)"/.exec(body)?.[1];
  return [...known, ...(nonce ? [nonce] : [])].reduce((text, value) => text.replaceAll(value, 'same'), body);
}

/** A photo that lies in the store, sent by its owner. */
export async function storePhoto(world: World, bytes: Buffer): Promise<string> {
  const path = `/api/rounds/${world.roundId}/photos?key=${randomUUID()}&view=back`;
  const sent = await ask(path, world.sessions.owner, { method: 'POST', body: new Uint8Array(bytes), headers: { 'content-type': 'image/jpeg' } }); // prettier-ignore
  const { id } = JSON.parse(sent.body) as { id: string };
  return id;
}

/** Those who must not get in first, the owner last: a thing that is deleted is deleted by then. */
export const inOrder = (roles: readonly Role[]): Role[] => [
  ...roles.filter((role) => role !== 'owner'),
  'owner',
];
