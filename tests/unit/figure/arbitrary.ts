import fc from 'fast-check';
import { PROPORTION_RANGES, type Proportions } from '@/diagnosis/figure/proportions';

const amount = ({ min, max }: { min: number; max: number }) => fc.double({ min, max, noNaN: true });

/** Any proportions that the drawing promises to hold for. */
export const anyProportions: fc.Arbitrary<Proportions> = fc.record({
  hip: amount(PROPORTION_RANGES.hip),
  waist: amount(PROPORTION_RANGES.waist),
  front: amount(PROPORTION_RANGES.front),
  seat: amount(PROPORTION_RANGES.seat),
  thigh: amount(PROPORTION_RANGES.thigh),
  legLine: amount(PROPORTION_RANGES.legLine),
  height: amount(PROPORTION_RANGES.height),
  hipHigherSide: fc.constantFrom('left' as const, 'right' as const, null),
});
