export interface ProblemBody {
  kind: string;
  message: string;
  fields?: Record<string, string[]>;
  mine?: unknown;
  theirs?: unknown;
}

export type Sent<T> = { ok: true; value: T } | { ok: false; status: number; problem: ProblemBody };

const OFFLINE: ProblemBody = {
  kind: 'offline',
  message: 'There is no connection just now. What you typed is still here; try again in a moment.',
};

/** Sends JSON and takes JSON back. A failure is a value with a sentence to show; only a bug throws. */
export async function sendJson<T>(
  method: 'POST' | 'PUT' | 'PATCH' | 'DELETE',
  url: string,
  body?: unknown,
): Promise<Sent<T>> {
  let response: Response;
  try {
    response = await fetch(url, {
      method,
      headers: body === undefined ? {} : { 'content-type': 'application/json' },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  } catch {
    return { ok: false, status: 0, problem: OFFLINE };
  }
  const answer: unknown = await response.json().catch(() => null);
  if (response.ok) return { ok: true, value: answer as T };
  const problem = isProblem(answer)
    ? answer
    : { kind: 'failed', message: 'The answer could not be read. Try again.' };
  return { ok: false, status: response.status, problem };
}

const isProblem = (value: unknown): value is ProblemBody =>
  typeof value === 'object' && value !== null && 'message' in value && typeof value.message === 'string';

/** For `useSWR`: throws the problem as an Error, which SWR keeps beside the last good data. */
export async function fetchJson<T>(url: string): Promise<T> {
  const response = await fetch(url);
  if (!response.ok) throw new Error(`${response.status}`);
  return (await response.json()) as T;
}
