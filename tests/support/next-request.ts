import { vi } from 'vitest';

/*
 * What Next gives to server actions, for tests that call them directly:
 *   vi.mock('next/headers', () => import('../support/next-request'));
 *   vi.mock('next/navigation', () => import('../support/next-request'));
 */
const jar = new Map<string, string>();
let sent = new Headers();

/** One person's browser: what it holds and what it sends. Starts with an empty jar. */
export function newBrowser(headers: Record<string, string> = {}): Map<string, string> {
  Reflect.set(globalThis, Symbol.for('ruckle.client-address'), true); // as the server's own part says of itself
  jar.clear();
  sent = new Headers({
    origin: 'http://127.0.0.1:4321',
    'sec-fetch-site': 'same-origin',
    'x-ruckle-client': '192.0.2.1',
    'user-agent': 'test',
    ...headers,
  });
  return jar;
}

export const headers = async () => sent;

export const setCookie = vi.fn();

export const cookies = async () => ({
  get: (name: string) => (jar.has(name) ? { name, value: jar.get(name) ?? '' } : undefined),
  set: (name: string, value: string, options: { maxAge: number }) => {
    setCookie(name, value, options);
    if (options.maxAge > 0) jar.set(name, value);
    else jar.delete(name);
  },
});

export class Redirected extends Error {
  constructor(readonly to: string) {
    super(`redirected to ${to}`);
  }
}

export const redirect = (to: string): never => {
  throw new Redirected(to);
};

/** Where an action sent the browser, or what it answered. */
export async function outcomeOf<T>(answer: Promise<T>): Promise<T | { to: string }> {
  try {
    return await answer;
  } catch (thrown) {
    if (thrown instanceof Redirected) return { to: thrown.to };
    throw thrown;
  }
}

export function formOf(fields: Record<string, string>): FormData {
  const form = new FormData();
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return form;
}
