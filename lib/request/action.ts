import 'server-only';
import { headers } from 'next/headers';
import { z } from 'zod';
import { env } from '@/lib/env';
import { isSameOrigin } from './same-origin';

export interface FormState {
  /** A sentence for the whole form. */
  message?: string;
  isDone?: boolean;
  fields?: Record<string, string[]>;
  /** What was typed, given back so that nothing has to be typed twice; never a password. */
  values?: Record<string, string>;
}

const SECRET = new Set(['password', 'current', 'token']);

const typedIn = (form: FormData) =>
  Object.fromEntries(
    [...form].filter(
      (entry): entry is [string, string] =>
        typeof entry[1] === 'string' && !SECRET.has(entry[0]) && !entry[0].startsWith('$'),
    ),
  );

/**
 * Every account form goes through here: same origin, parsed once by the schema that the browser uses too, faults named by field.
 * A handler that redirects throws, as Next does it.
 */
export function formAction<S extends z.ZodType>(
  schema: S,
  handler: (input: z.infer<S>, request: Headers) => Promise<FormState>,
) {
  return async (_before: FormState, form: FormData): Promise<FormState> => {
    const request = await headers();
    const values = typedIn(form);
    if (!isSameOrigin(request, env().APP_ORIGIN))
      return { values, message: 'This form did not come from Ruckle. Open the page again.' };
    const parsed = schema.safeParse(Object.fromEntries(form));
    if (!parsed.success) {
      return { values, fields: z.flattenError(parsed.error).fieldErrors as Record<string, string[]> };
    }
    return { values, ...(await handler(parsed.data, request)) };
  };
}
