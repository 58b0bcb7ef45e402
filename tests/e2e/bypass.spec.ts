import { request } from 'node:http';
import { expect, test } from '@playwright/test';
import postgres from 'postgres';
import { makeWorld, type World } from '../access/world';
import { answerOf, ask, ORIGIN } from '../support/ask';

const sql = postgres(process.env.ADMIN_DATABASE_URL ?? '', { max: 1 });
let world: World;
test.beforeAll(async () => void (world = await makeWorld(sql)));
test.afterAll(() => sql.end());

const HEADERS: Record<string, string>[] = [
  { 'x-middleware-subrequest': 'proxy:proxy:proxy:proxy:proxy' },
  { 'x-middleware-subrequest': 'src/middleware:src/middleware:src/middleware:src/middleware:src/middleware' },
  { 'x-middleware-prefetch': '1' },
  { 'x-middleware-rewrite': '/journals' },
  { 'x-nextjs-data': '1' },
  { rsc: '1' },
  { rsc: '1', 'next-router-prefetch': '1' },
  { rsc: '1', 'next-router-segment-prefetch': '/_tree' },
  { purpose: 'prefetch', 'sec-purpose': 'prefetch' },
  { 'x-original-url': '/sign-in', 'x-rewrite-url': '/sign-in' },
  { 'x-invoke-path': '/sign-in', 'x-matched-path': '/sign-in' },
  { 'x-forwarded-host': 'elsewhere.invalid', 'x-forwarded-proto': 'https' },
  { 'x-http-method-override': 'GET' },
  { 'x-ruckle-path': '//elsewhere.invalid' },
  { authorization: 'Bearer anything' },
];

test('no header opens another person’s things, nor leads anyone away', async () => {
  for (const headers of HEADERS) {
    for (const session of [world.sessions.other, null]) {
      for (const path of [`/journals/${world.journalId}`, `/journals/${world.journalId}/rounds/1`, `/wearers/${world.wearerId}`, `/api/rounds/${world.roundId}/photos`]) {
        const answered = await ask(path, session, { headers });
        const told = `${JSON.stringify(headers)} ${path}`;
        expect(answered.body, told).not.toMatch(/Wool trousers|"uploadKey"/);
        expect(answered.location ?? '', told).not.toContain('elsewhere');
        // Asked only to be looked ahead at, the framework answers for the proxy and no page runs: an empty object.
        if (headers['x-middleware-prefetch'] && !path.startsWith('/api')) expect(answered.body, told).toBe('{}');
        // Asked for as data, a page tells in 200 that there is nothing: as just seen, nothing of the owner is in it.
        else if (!headers.rsc) expect(answerOf(answered), told).not.toBe('open');
      }
    }
  }
}); // prettier-ignore

test('no spelling of an address opens another person’s things', async () => {
  const id = world.journalId;
  const spellings = [`/journals/${id}/`, `//journals/${id}`, `/%6aournals/${id}`, `/journals/${id.toUpperCase()}`, `/journals/./${id}`, `/journals/x/../${id}`, `/journals/${id}?_rsc=1`, `/journals/${id};x`, `/journals/${id}%00`, `/journals/${id}.rsc`, `/_next/data/build/journals/${id}.json`, `/en/journals/${id}`, `/journals%2f${id}`, `/JOURNALS/${id}`]; // prettier-ignore
  for (const path of spellings)
    for (const session of [world.sessions.other, null])
      expect((await ask(path, session)).body, path).not.toContain('Wool trousers');
});

test('requests that change something are refused from elsewhere', async () => {
  const foreign: Record<string, string>[] = [{ origin: 'https://elsewhere.invalid' }, { origin: 'null' }, { 'sec-fetch-site': 'cross-site' }, { 'sec-fetch-site': 'same-site' }, {}]; // prettier-ignore
  for (const headers of foreign) {
    const sent = await fetch(new URL(`/api/journals/${world.journalId}`, ORIGIN), {
      method: 'DELETE',
      headers: { ...headers, cookie: `session=${world.sessions.owner}` },
    });
    expect(sent.status, JSON.stringify(headers)).toBe(403);
  }
  expect(answerOf(await ask(`/journals/${world.journalId}`, world.sessions.owner))).toBe('open');
});

test('every page carries its own nonce on every script, and the same strict policy', async () => {
  const nonces = new Set<string>();
  for (const path of ['/', '/sign-in', '/sign-up', '/journals', '/settings', `/journals/${world.journalId}`, '/no/such/page']) {
    const { headers, body } = await ask(path, world.sessions.owner);
    const policy = headers.get('content-security-policy') ?? '';
    const nonce = /'nonce-([^']+)'/.exec(policy)?.[1] ?? 'none';
    nonces.add(nonce);
    const scripts = body.match(/<script\b[^>]*>/g) ?? [];
    expect(scripts.length, path).toBeGreaterThan(0);
    expect(scripts.filter((tag) => !tag.includes(`nonce="${nonce}"`)), path).toEqual([]);
    expect(policy.replace(nonce, 'N'), path).toBe("default-src 'none'; script-src 'nonce-N' 'strict-dynamic'; style-src 'self' 'unsafe-inline'; img-src 'self' blob: data:; font-src 'self'; connect-src 'self'; worker-src 'self'; manifest-src 'self'; frame-ancestors 'none'; base-uri 'none'; form-action 'self'");
  }
  expect(nonces.size).toBe(7);
}); // prettier-ignore

test('API answers are kept by nobody', async () => {
  for (const [path, session] of [['/api/journals', world.sessions.owner], ['/api/journals', null], ['/api/no/such', world.sessions.owner]] as const)
    expect((await ask(path, session)).headers.get('cache-control'), path).toBe('private, no-store');
}); // prettier-ignore

/** A wrong sign-in from an address of this machine's own, with whatever headers. */
function trySigningIn(
  localAddress: string,
  headers: Record<string, string>,
  form: Record<string, string>,
): Promise<string> {
  const boundary = 'edge';
  const parts = Object.entries(form).map(([name, value]) => `--${boundary}\r\nContent-Disposition: form-data; name="${name}"\r\n\r\n${value}\r\n`); // prettier-ignore
  return new Promise((resolve, reject) => {
    const sent = request(new URL('/sign-in', ORIGIN), { method: 'POST', localAddress, headers: { origin: ORIGIN, 'content-type': `multipart/form-data; boundary=${boundary}`, ...headers } }, (answer) => {
      let body = '';
      answer.setEncoding('utf8').on('data', (chunk: string) => (body += chunk)).on('end', () => resolve(body));
    }); // prettier-ignore
    sent.on('error', reject).end(`${parts.join('')}--${boundary}--\r\n`);
  });
}

test('spoofed forwarding headers buy no sixth try', async () => {
  const page = await ask('/sign-in', null);
  const hidden = [...page.body.matchAll(/<input type="hidden" name="(\$ACTION[^"]*)"(?: value="([^"]*)")?/g)].map(([, name = '', value = '']) => [name, value.replaceAll('&quot;', '"')]); // prettier-ignore
  const attempt = (i: number) => {
    const spoofed = `10.9.8.${i}`;
    const headers = { 'x-forwarded-for': spoofed, 'x-real-ip': spoofed, forwarded: `for=${spoofed}`, 'x-ruckle-client': spoofed }; // prettier-ignore
    return trySigningIn('127.0.0.77', headers, { ...Object.fromEntries(hidden), email: `nobody-${i}-${Date.now()}@example.org`, password: 'wrong password' }); // prettier-ignore
  };
  for (let i = 0; i < 5; i += 1) expect(await attempt(i)).toContain('do not go together');
  expect(await attempt(6)).toContain('tried too often');
});
