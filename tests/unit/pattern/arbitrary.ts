import fc from 'fast-check';
import { draftBlock, type Block } from '@/diagnosis/pattern/blocks/block';
import { blockMeasures } from '@/diagnosis/pattern/blocks/measures';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** Blocks for bodies from slight to large, waist from much smaller than the hip to as wide; woven and stretch. */
export const anyBlock: fc.Arbitrary<Block> = fc
  .record({
    hip: between(820, 1450),
    waistShare: between(0.68, 1),
    depthShare: between(0.9, 1.15),
    legShare: between(0.85, 1.15),
    slope: between(4, 15),
    stretch: fc.constantFrom(0, 0, 0.15, 0.3),
    inseam: between(680, 860),
  })
  .map(({ hip, waistShare, depthShare, legShare, slope, stretch, inseam }) => {
    const usual = blockMeasures({ hipMm: hip });
    return draftBlock(
      blockMeasures({
        hipMm: hip,
        waistMm: hip * waistShare,
        depthMm: usual.depthMm * depthShare,
        kneeMm: usual.kneeMm * legShare,
        hemMm: usual.hemMm * legShare,
        inseamMm: inseam,
        backSlopeDeg: slope,
        stretch,
      }),
    );
  });

/** An amount between a step and a stop in total, mm. */
export const anyAmount = (most: number) => between(1, most);
