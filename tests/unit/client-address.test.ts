import { get, createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { once } from 'node:events';
import { beforeEach, describe, expect, it, vi } from 'vitest';

const proxies = vi.hoisted(() => ({ TRUSTED_PROXIES: 0 }));
vi.mock('@/lib/env', () => ({ env: () => proxies }));

const NOTED = Symbol.for('ruckle.client-address');
const addressOf = async (headers: Record<string, string>) =>
  (await import('@/lib/request/client-address')).clientAddress(new Headers(headers));

beforeEach(() => {
  proxies.TRUSTED_PROXIES = 0;
  Reflect.set(globalThis, NOTED, true);
});

describe('the client address', () => {
  it('is believed from no header when the server does not note the socket', async () => {
    Reflect.set(globalThis, NOTED, false);
    expect(await addressOf({ 'x-ruckle-client': '203.0.113.1', 'x-forwarded-for': '203.0.113.2' })).toBe(
      'unknown',
    );
  });

  it('is the socket’s, whatever is forwarded', async () => {
    expect(await addressOf({ 'x-ruckle-client': '203.0.113.1', 'x-forwarded-for': '203.0.113.2' })).toBe(
      '203.0.113.1',
    );
  });

  it.each([
    [1, 'spoofed, 203.0.113.7', '203.0.113.7'],
    [2, 'spoofed, 203.0.113.7, 10.0.0.1', '203.0.113.7'],
    [2, '203.0.113.7', '192.0.2.9'],
    [1, '', '192.0.2.9'],
  ])('with %i trusted proxies and "%s" forwarded is %s', async (count, forwarded, expected) => {
    proxies.TRUSTED_PROXIES = count;
    expect(await addressOf({ 'x-ruckle-client': '192.0.2.9', 'x-forwarded-for': forwarded })).toBe(expected);
  });

  it.each([
    ['::ffff:192.0.2.9', '192.0.2.9'],
    ['2001:db8:0:1:aaaa::1', '2001:db8:0:1::/64'],
    ['2001:DB8::1', '2001:db8:0:0::/64'],
    ['fe80::1%eth0', 'fe80:0:0:0::/64'],
    ['::1', '0:0:0:0::/64'],
  ])('%s counts as %s', async (socket, expected) => {
    expect(await addressOf({ 'x-ruckle-client': socket })).toBe(expected);
  });

  it('is noted over what a client sends under that name, in any spelling', async () => {
    await import('../../scripts/services/client-address.mjs');
    const server = createServer((request, response) =>
      response.end(JSON.stringify(request.headers['x-ruckle-client'])),
    );
    await once(server.listen(0, '127.0.0.1'), 'listening');
    const { port } = server.address() as AddressInfo;
    for (const name of ['x-ruckle-client', 'X-RUCKLE-CLIENT', 'X-Ruckle-Client']) {
      const [response] = await once(
        get({ port, host: '127.0.0.1', headers: { [name]: '203.0.113.66' } }),
        'response',
      );
      let body = '';
      for await (const chunk of response) body += String(chunk);
      expect(JSON.parse(body)).toBe('127.0.0.1');
    }
    server.close();
  });
});
