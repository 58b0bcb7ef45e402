import 'server-only';
import { z } from 'zod';
import type { Viewer } from '@/db/queries/viewer';
import { currentViewer } from '@/lib/auth/viewer';
import { env } from '@/lib/env';
import { log } from '@/lib/log';
import { answerJson, answerProblem, Problem } from './problem';
import { readText } from './read-text';
import { isSameOrigin } from './same-origin';

interface RouteSpec<
  P extends z.ZodType,
  Q extends z.ZodType,
  B extends z.ZodType,
  A extends 'viewer' | 'anyone',
> {
  access: A;
  params?: P;
  query?: Q;
  /** A JSON body. A handler that leaves it out reads the request itself (uploads). */
  body?: B;
}

interface RouteInput<
  P extends z.ZodType,
  Q extends z.ZodType,
  B extends z.ZodType,
  A extends 'viewer' | 'anyone',
> {
  viewer: A extends 'viewer' ? Viewer : Viewer | null;
  params: z.infer<P>;
  query: z.infer<Q>;
  body: z.infer<B>;
  request: Request;
}

type Context = { params: Promise<Record<string, string | string[] | undefined>> };

const JSON_BYTES_MAX = 1_048_576;

async function readJson(request: Request): Promise<unknown> {
  if (!/^application\/json\b/.test(request.headers.get('content-type') ?? '')) {
    throw new Problem(415, 'content-type', 'This address takes JSON.');
  }
  const text = await readText(request, JSON_BYTES_MAX);
  if (text === null) throw new Problem(413, 'too-large', 'That is more than can be saved at once.');
  try {
    return JSON.parse(text);
  } catch {
    throw new Problem(400, 'not-json', 'What was sent could not be read.');
  }
}

function parse<T extends z.ZodType>(
  schema: T | undefined,
  value: unknown,
  status: 400 | 404 | 422,
): z.infer<T> {
  if (!schema) return undefined as z.infer<T>;
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  if (status === 404) throw new Problem(404, 'not-found', 'There is nothing at this address.');
  const fields = z.flattenError(result.error).fieldErrors;
  throw new Problem(status, 'invalid', 'Some fields need another look.', { fields });
}

/**
 * Every route handler goes through here: same origin for changing requests, who is asking, parsing, errors as
 * `{ kind, message, fields? }`. What the handler returns is answered as JSON unless it is a Response.
 */
export function route<
  A extends 'viewer' | 'anyone',
  P extends z.ZodType = z.ZodUndefined,
  Q extends z.ZodType = z.ZodUndefined,
  B extends z.ZodType = z.ZodUndefined,
>(spec: RouteSpec<P, Q, B, A>, handler: (input: RouteInput<P, Q, B, A>) => Promise<unknown>) {
  return async (request: Request, context: Context): Promise<Response> => {
    try {
      if (!['GET', 'HEAD'].includes(request.method) && !isSameOrigin(request.headers, env().APP_ORIGIN)) {
        throw new Problem(403, 'cross-origin', 'This request did not come from Ruckle.');
      }
      const viewer = await currentViewer();
      if (spec.access === 'viewer' && !viewer) throw new Problem(401, 'signed-out', 'Sign in to go on.');
      const input = {
        viewer,
        params: parse(spec.params, await context.params, 404),
        query: parse(spec.query, Object.fromEntries(new URL(request.url).searchParams), 400),
        body: spec.body ? parse(spec.body, await readJson(request), 422) : undefined,
        request,
      } as RouteInput<P, Q, B, A>;
      const answer = await handler(input);
      return answer instanceof Response ? answer : answerJson(answer);
    } catch (thrown) {
      if (thrown instanceof Problem) return answerProblem(thrown);
      log().error({ err: thrown, method: request.method }, 'a request failed');
      return answerProblem(
        new Problem(503, 'failed', 'Something went wrong here. Nothing of yours was lost; try again.'),
      );
    }
  };
}
