import 'server-only';
import { isIPv6 } from 'node:net';
import { env } from '@/lib/env';

/** Set by scripts/services/client-address.mjs, which notes the socket's address on every request before Next sees it. */
const NOTED = Symbol.for('ruckle.client-address');

/** A line is given a whole /64 of IPv6 addresses (RFC 6177): they count as one. IPv4 written as IPv6 is IPv4. */
function lineOf(address: string): string {
  const mapped = /^::ffff:(\d{1,3}(?:\.\d{1,3}){3})$/i.exec(address);
  if (mapped?.[1]) return mapped[1];
  if (!isIPv6(address)) return address;
  const [head = '', tail] = address.split('%')[0]?.split('::') ?? [];
  const left = head.split(':').filter(Boolean);
  const right = (tail ?? '').split(':').filter(Boolean);
  const zeros = Array<string>(tail === undefined ? 0 : Math.max(0, 8 - left.length - right.length)).fill('0');
  const network = [...left, ...zeros, ...right].slice(0, 4);
  return `${network.map((group) => Number.parseInt(group, 16).toString(16)).join(':')}::/64`;
}

/**
 * Where a request comes from. The socket's address is in a header of our own, over whatever a client sent under that name; a
 * server started without that part knows no address and counts all clients as one. Forwarding headers count only from as many
 * trusted proxies as are configured, from the right.
 */
export function clientAddress(headers: Headers): string {
  const isNoted = Reflect.get(globalThis, NOTED) === true;
  const socket = (isNoted ? headers.get('x-ruckle-client') : null) || 'unknown';
  const proxies = env().TRUSTED_PROXIES;
  if (proxies === 0) return lineOf(socket);
  const forwarded = (headers.get('x-forwarded-for') ?? '').split(',').map((part) => part.trim());
  return lineOf(forwarded.at(-proxies) || socket);
}
