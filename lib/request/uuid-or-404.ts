import 'server-only';
import { notFound } from 'next/navigation';
import { z } from 'zod';

/** A path segment that must be an id. Anything else is the same 404 as an id that is nobody's. */
export function uuidOr404(segment: string): string {
  const parsed = z.uuid().safeParse(segment);
  if (!parsed.success) notFound();
  return parsed.data;
}

/** A query parameter that may be an id; anything else is as if it were not there. */
export function optionalUuid(value: string | string[] | undefined): string | undefined {
  const parsed = z.uuid().safeParse(value);
  return parsed.success ? parsed.data : undefined;
}
