import { bigint, index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt } from './columns';

/** One row per change, in its transaction: ids, verb, field names, never contents. The application may only add rows. */
export const audit = pgTable(
  'audit',
  {
    id: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
    at: createdAt(),
    actorId: uuid(),
    verb: text().notNull(),
    objectKind: text().notNull(),
    objectId: uuid(),
    fields: text().array().notNull().default([]),
  },
  (table) => [index('audit_object').on(table.objectId), index('audit_actor').on(table.actorId, table.id)],
);
