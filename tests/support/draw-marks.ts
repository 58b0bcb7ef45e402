import fc from 'fast-check';
import { MARK_KINDS, type Mark, newMark, photoPoint } from '@/components/marks/model/mark';

/** Any point of a photo. */
export const anyPoint = fc
  .tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true }))
  .map(([x, y]) => photoPoint(x, y));

/** Any mark of few points, named by a small number so that two may share a name. */
export const anyMark: fc.Arbitrary<Mark> = fc
  .record({
    id: fc.integer({ min: 0, max: 9 }).map((number) => `mark-${number}`),
    kind: fc.constantFrom(...MARK_KINDS),
    severity: fc.constantFrom(1 as const, 2 as const, 3 as const),
    points: fc.array(anyPoint, { minLength: 2, maxLength: 5 }),
  })
  .map(({ id, kind, severity, points }) => newMark(id, kind, severity, points));

/** Marks with a name each. */
export const anyMarks = fc.uniqueArray(anyMark, { selector: ({ id }) => id, maxLength: 8 });
