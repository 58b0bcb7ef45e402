import { integer, pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** Counters of the rate limiter (its own column names); rows that have run out are swept by the worker. */
export const rateLimits = pgTable('rate_limits', {
  key: text().primaryKey(),
  points: integer().notNull(),
  expire: timestamp({ withTimezone: true, mode: 'date' }),
});
