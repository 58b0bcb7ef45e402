import type { CaseInput } from '../case-schema';
import { draftBlock, type Block } from './blocks/block';
import { blockMeasures, blockMeasuresSchema } from './blocks/measures';

/** A knit stretches more on the gauge than a pair of trousers may use; beyond this share the block is cut no smaller. */
const MOST_STRETCH = 0.6;

/**
 * The block that stands in for a person's own pieces: drafted to waist and hip of the body (mm) and, for a knit, to its stretch.
 * What was not measured follows the reference body; so does all of it where the measures are beyond what can be drafted.
 */
export function standInBlock(body: CaseInput['body'], cloth: CaseInput['cloth']): Block {
  const { hipMm, waistMm } = body ?? {};
  const stretch = cloth?.kind === 'knit' ? Math.min(MOST_STRETCH, (cloth.stretchPercent ?? 0) / 100) : 0;
  const known = { ...(hipMm === undefined ? {} : { hipMm }), ...(waistMm === undefined ? {} : { waistMm }) };
  const measures = blockMeasures({ ...known, stretch });
  return draftBlock(blockMeasuresSchema.safeParse(measures).data ?? blockMeasures());
}
