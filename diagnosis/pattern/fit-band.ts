import { draftBand } from './blocks/band';
import type { Block } from './blocks/block';
import { edgeLength } from './measure';

const waistMm = ({ front, back }: Block) => edgeLength(front, 'waist') + edgeLength(back, 'waist');

/** How much longer (+) or shorter each half of the band must be for it to meet the waist as it was drafted to, mm. */
export const bandWants = (drafted: Block, now: Block): number =>
  waistMm(now) -
  waistMm(drafted) -
  (edgeLength(now.waistband, 'lower') - edgeLength(drafted.waistband, 'lower'));

/** The pieces with the band drawn anew to meet the waist: the difference shared out along it, its height and contour kept. */
export function fitBand(drafted: Block, now: Block): Block {
  const byMm = bandWants(drafted, now);
  const [lowerMm, upperMm] = [edgeLength(now.waistband, 'lower'), edgeLength(now.waistband, 'upper')];
  const waistband = draftBand({
    lowerMm: lowerMm + byMm,
    heightMm: edgeLength(now.waistband, 'front'),
    contourMm: lowerMm - upperMm,
  });
  return { ...now, waistband };
}
