import { boolean, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, version } from './columns';
import { journals } from './journals';

/** A size by its name; `steps` counts past the end of the chart, 0 within it. */
export interface KeptSize {
  size: string;
  steps: number;
}
/** A length as it was typed, and in mm. */
export interface KeptLength {
  mm: number;
  typed: string;
}

/**
 * What was decided before the first cut of a garment: a size for each level, the ease, the cloth's gauge, what was altered on
 * paper first, what is left out of the reading, what is ticked on the cutting sheet. One row a journal, made when first written.
 */
export const journalCuts = pgTable('journal_cuts', {
  journalId: uuid()
    .primaryKey()
    .references(() => journals.id, { onDelete: 'cascade' }),
  /** `base` is the size that is cut; a level that is not named follows the proposal. */
  sizes: jsonb().$type<Record<string, KeptSize>>().notNull().default({}),
  patternWaist: text({ enum: ['narrowest', 'navel', 'band'] }),
  ease: jsonb().$type<Record<string, KeptLength>>().notNull().default({}),
  /** Three lengths of the folded gauge: relaxed, pulled, rested. */
  gauge: jsonb().$type<Partial<Record<'relaxed' | 'pulled' | 'rested', KeptLength>>>().notNull().default({}),
  cut: text({ enum: ['full', 'shorts'] })
    .notNull()
    .default('full'),
  isNarrowLeg: boolean().notNull().default(false),
  /** Measures whose suggestions were made on paper before the first cut; none of them: straight from the draft. */
  altered: text().array().notNull().default([]),
  /** Measures that are not to be evidence of the reading. */
  leftOut: text().array().notNull().default([]),
  ticked: text().array().notNull().default([]),
  createdAt: createdAt(),
  version: version(),
});
