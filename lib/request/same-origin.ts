import 'server-only';

/**
 * Whether a changing request comes from our own pages. A browser says so in `Sec-Fetch-Site`; where that is missing the
 * Origin must be ours. `Origin: null` (sandboxed frames, some redirects) never is.
 */
export function isSameOrigin(headers: Headers, appOrigin: string): boolean {
  const origin = headers.get('origin');
  if (origin === 'null') return false;
  if (origin !== null && origin !== appOrigin) return false;
  const site = headers.get('sec-fetch-site');
  if (site !== null) return site === 'same-origin';
  return origin === appOrigin;
}
