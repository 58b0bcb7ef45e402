import type { z } from 'zod';
import { caseSchema } from './case-schema';
import { nearestOf } from './nearest';

export interface CaseFault {
  /** Where, as a path: `history[2].signs[0].side`. */
  field: string;
  message: string;
}

/** The first thing that does not have the shape of a case, an unknown key with the nearest known one. */
export function shapeFault(error: z.ZodError): CaseFault {
  const issue = error.issues[0]!;
  const field = pathOf(issue.path);
  if (issue.code !== 'unrecognized_keys') return { field: field || 'case', message: issue.message };
  const key = issue.keys[0]!;
  const near = nearestOf(key, keysNear(issue.path));
  return {
    field: field ? `${field}.${key}` : key,
    message: `unknown key${near ? `; nearest is "${near}"` : ''}`,
  };
}

/** Keys that are allowed where an unknown one was found. */
function keysNear(path: readonly PropertyKey[]): string[] {
  let schema: unknown = caseSchema;
  for (const part of path) schema = childOf(schema, part);
  const shape = unwrapped(schema);
  return shape && 'shape' in shape ? Object.keys(shape.shape as object) : [];
}

function unwrapped(schema: unknown): Record<string, unknown> | undefined {
  let at = schema as { def?: { innerType?: unknown } } | undefined;
  while (at?.def?.innerType) at = at.def.innerType as typeof at;
  return at as Record<string, unknown> | undefined;
}

function childOf(schema: unknown, part: PropertyKey): unknown {
  const at = unwrapped(schema);
  if (typeof part === 'number') return at?.element;
  return (at?.shape as Record<PropertyKey, unknown> | undefined)?.[part];
}

function pathOf(path: readonly PropertyKey[]): string {
  return path.reduce<string>(
    (text, part) =>
      typeof part === 'number' ? `${text}[${part}]` : text ? `${text}.${String(part)}` : String(part),
    '',
  );
}
