import { z } from 'zod';

const girth = z.number().min(150).max(3000);
const length = z.number().min(60).max(1500);

/** What a trouser block is drafted from, mm. Knee and hem are girths of the finished leg. */
export const blockMeasuresSchema = z.strictObject({
  waistMm: girth,
  hipMm: girth,
  /** Waist to seat surface, seated. */
  depthMm: length,
  inseamMm: length,
  kneeMm: girth,
  hemMm: girth,
  easeWaistMm: z.number().min(-300).max(400),
  easeHipMm: z.number().min(-300).max(600),
  /** Lean of centre back from plumb. */
  backSlopeDeg: z.number().min(0).max(20),
  /** Share of its width that the cloth gives, 0 for a woven. */
  stretch: z.number().min(0).max(1),
});
export type BlockMeasures = z.infer<typeof blockMeasuresSchema>;

/**
 * Measures of the reference body (hip 1000 mm) that stand in for what was not measured; knee and hem keep the ratio of the
 * published draft (standards:D02: seat 100, knee 52, hem 44 cm; rise 26 cm; inside leg 76 cm). Slope and ease: common practice.
 */
const REFERENCE: BlockMeasures = {
  waistMm: 780,
  hipMm: 1000,
  depthMm: 260,
  inseamMm: 760,
  kneeMm: 520,
  hemMm: 440,
  easeWaistMm: 10,
  easeHipMm: 40,
  backSlopeDeg: 12,
  stretch: 0,
};

/** Measures of a block, those not given carried over from the reference body by the hip. */
export function blockMeasures(known: Partial<BlockMeasures> = {}): BlockMeasures {
  const ratio = (known.hipMm ?? REFERENCE.hipMm) / REFERENCE.hipMm;
  // Lengths grow less than girths.
  const lengthRatio = Math.min(1.3, Math.max(0.8, ratio));
  const stretch = known.stretch ?? 0;
  return {
    ...REFERENCE,
    waistMm: REFERENCE.waistMm * ratio,
    depthMm: REFERENCE.depthMm * lengthRatio,
    kneeMm: REFERENCE.kneeMm * ratio,
    hemMm: REFERENCE.hemMm * ratio,
    ...(stretch > 0 ? { easeWaistMm: 0, easeHipMm: 0, backSlopeDeg: 8 } : {}),
    ...known,
  };
}
