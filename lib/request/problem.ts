import 'server-only';

/** An expected failure on its way out of a handler: what happened, what was kept, what to do. */
export class Problem extends Error {
  constructor(
    readonly status: 400 | 401 | 403 | 404 | 409 | 413 | 415 | 422 | 429 | 503,
    readonly kind: string,
    message: string,
    readonly extra: Record<string, unknown> = {},
  ) {
    super(message);
  }
}

export const notFound = () => new Problem(404, 'not-found', 'There is nothing at this address.');

const PRIVATE = { 'cache-control': 'private, no-store' };

export function answerJson(body: unknown, status = 200, headers: Record<string, string> = {}): Response {
  return Response.json(body, { status, headers: { ...PRIVATE, ...headers } });
}

export function answerProblem(problem: Problem): Response {
  const { status, kind, message, extra } = problem;
  const headers: Record<string, string> =
    typeof extra.retryAfterS === 'number' ? { 'retry-after': String(extra.retryAfterS) } : {};
  return answerJson({ kind, message, ...extra }, status, headers);
}
