import 'server-only';
import { cookies } from 'next/headers';
import { env } from '@/lib/env';
import { hashSecret } from './secret';

/*
 * Anyone may ask for an account under another person's address, with a password of their own. If the confirming click alone
 * signed in, that person would move into an account to which a stranger holds the password. So only the browser that set the
 * password goes straight in; any other is asked for the password, and whoever does not know it chooses a new one.
 * The mark is a hash of the salted password hash: nobody can work it out, and it says whose password stands.
 */
const DAY_S = 86_400;
const isSecure = () => env().APP_ORIGIN.startsWith('https:');
const name = () => (isSecure() ? '__Host-sign-up' : 'sign-up');

export async function markSignUp(passwordHash: string): Promise<void> {
  (await cookies()).set(name(), hashSecret(passwordHash), {
    httpOnly: true,
    sameSite: 'lax',
    secure: isSecure(),
    path: '/',
    maxAge: DAY_S,
  });
}

export async function isMarkedSignUp(passwordHash: string): Promise<boolean> {
  return (await cookies()).get(name())?.value === hashSecret(passwordHash);
}
