import 'server-only';
import { cookies } from 'next/headers';
import { env } from '@/lib/env';
import { ABSOLUTE_DAYS } from './sessions';

/** Over https the browser itself holds the name to this host, this path and encryption. */
const isSecure = () => env().APP_ORIGIN.startsWith('https:');
const name = () => (isSecure() ? '__Host-session' : 'session');

export async function readSessionCookie(): Promise<string | null> {
  return (await cookies()).get(name())?.value ?? null;
}

/** Lives as long as a session may at the most; how long it may lie idle is the server's to say. */
export async function writeSessionCookie(secret: string): Promise<void> {
  (await cookies()).set(name(), secret, {
    httpOnly: true,
    sameSite: 'lax',
    secure: isSecure(),
    path: '/',
    maxAge: ABSOLUTE_DAYS * 86_400,
  });
}

export async function clearSessionCookie(): Promise<void> {
  (await cookies()).set(name(), '', {
    httpOnly: true,
    sameSite: 'lax',
    secure: isSecure(),
    path: '/',
    maxAge: 0,
  });
}
