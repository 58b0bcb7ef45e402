import { sql } from 'drizzle-orm';
import { customType, integer, timestamp, uuid } from 'drizzle-orm/pg-core';
import { v7 } from 'uuid';
import { type Millimetres, toMillimetres } from '@/diagnosis/units/millimetres';

/** A length, exact to a nanometre, so that every inch fraction and every tenth of a millimetre survives a round trip. */
export const lengthMm = customType<{ data: Millimetres; driverData: string }>({
  dataType: () => 'numeric(10,6)',
  fromDriver: (text) => toMillimetres(Number(text)),
  toDriver: (mm) => mm.toFixed(6),
});

/** Ordered by time of making; the client may bring its own, so that an upload sent twice is one row. */
export const id = () => uuid().primaryKey().$defaultFn(v7);
export const moment = () => timestamp({ withTimezone: true, mode: 'date' });
export const createdAt = () =>
  moment()
    .notNull()
    .default(sql`now()`);
/** Raised by one in every guarded write; a writer who has seen another number has lost the race. */
export const version = () => integer().notNull().default(1);
export const deletedAt = () => moment();
