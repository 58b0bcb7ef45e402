import 'server-only';
import { env } from '@/lib/env';

/**
 * Where a request comes from. The web server notes the socket's address in a header of our own, overwriting whatever a client
 * sent under that name; forwarding headers count only from as many trusted proxies as are configured, from the right.
 */
export function clientAddress(headers: Headers): string {
  const socket = headers.get('x-ruckle-client') ?? 'unknown';
  const proxies = env().TRUSTED_PROXIES;
  if (proxies === 0) return socket;
  const forwarded = (headers.get('x-forwarded-for') ?? '').split(',').map((part) => part.trim());
  return forwarded.at(-proxies) || socket;
}
