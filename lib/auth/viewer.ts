import 'server-only';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { cache } from 'react';
import { ownPath } from '@/components/account/account-schema';
import type { Viewer } from '@/db/queries/viewer';
import { readSessionCookie } from './cookie';
import { viewerOfSecret } from './sessions';

/** Who is asking, once a request; null when nobody is signed in. */
export const currentViewer = cache(async (): Promise<Viewer | null> => {
  const secret = await readSessionCookie();
  return secret ? viewerOfSecret(secret, new Date()) : null;
});

/** For pages, before anything is sent: signed out goes to sign in, and comes back to the same page afterwards. */
export async function requireViewer(): Promise<Viewer> {
  const viewer = await currentViewer();
  if (viewer) return viewer;
  const here = ownPath((await headers()).get('x-ruckle-path'));
  return redirect(`/sign-in?next=${encodeURIComponent(here)}`);
}
