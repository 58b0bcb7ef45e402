import { parseCase } from '@/diagnosis/case';
import type { Case, CaseInput } from '@/diagnosis/case-schema';
import { diagnose, startReading } from '@/diagnosis/diagnose';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { Reading } from '@/diagnosis/reading';

/** A case that is meant to be valid, parsed; anything else fails the test. */
export function parsed(knowledge: Knowledge, input: Omit<CaseInput, 'garment'>): Case {
  const result = parseCase(knowledge, { garment: knowledge.garment, ...input });
  if (!result.ok) throw new Error(`${result.fault.field}: ${result.fault.message}`);
  return result.value;
}

/** The reading of a case that is meant to be valid. */
export function readCase(knowledge: Knowledge, input: Omit<CaseInput, 'garment'>): Reading {
  return diagnose(knowledge, parsed(knowledge, input));
}

/** The first part of the reading: everything but reasons and the exact re-score of checks. */
export function readFirst(knowledge: Knowledge, input: Omit<CaseInput, 'garment'>): Reading {
  return startReading(knowledge, parsed(knowledge, input)).first;
}

/** Probability and score of everything in a reading, by id, side and direction. */
export function numbersOf(reading: Reading): Map<string, number> {
  return new Map([
    ...reading.needs.map(
      (row) => [`${row.dimension} ${row.side} ${row.direction}`, row.probability] as const,
    ),
    ...reading.causes.map((row) => [row.cause, row.probability] as const),
    ...reading.corrections.map((row) => [`${row.correction} ${row.side}`, row.score] as const),
  ]);
}
