/** A configuration that cannot work is said at boot, not at the first request. */
export async function register() {
  if (process.env.NEXT_RUNTIME === 'nodejs') {
    const { env } = await import('@/lib/env');
    env();
  }
}
