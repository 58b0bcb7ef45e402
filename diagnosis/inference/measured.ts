import type { Measured } from '../case-schema';
import { addGaussian } from './checks';
import type { Draft } from './draft';
import { variablesFor } from './layout';
import type { Layout } from './layout';

/** Sums of three and more needs are passed as messages, which hold only while the sum is known no better than this, mm. */
const LONG_SUM_SD_MM = 18;

/** The same where a sum became long only because a need of it has a left and a right. */
const SIDED_SUM_SD_MM = 10;

/** Adds a measured sum of needs. A need that is split, measured without a side, counts by the mean of its legs. */
export function addMeasured(draft: Draft, layout: Layout, measured: Measured): void {
  const terms = measured.terms.flatMap(({ dimension, weight, side }) => {
    const place = layout.index.dimensions.get(dimension)!;
    const variables = variablesFor(layout, place, side);
    const perZ = (weight * layout.scaleMm[place]!) / variables.length;
    return variables.map((variable) => ({ variable, perZ }));
  });
  if (terms.length === 1) {
    const { variable, perZ } = terms[0]!;
    addGaussian(draft, variable, measured.needMm / perZ, measured.sdMm / Math.abs(perZ));
    return;
  }
  const leastMm = measured.terms.length > 2 ? LONG_SUM_SD_MM : terms.length > 2 ? SIDED_SUM_SD_MM : 0;
  const sdMm = Math.max(leastMm * layout.factors.length, measured.sdMm);
  draft.sums.push({ terms, meanMm: measured.needMm, sdMm });
}

/** The needs of a measured sum, whatever their order: what makes two measurements the same one. */
export function termsKey({ terms }: Measured): string {
  return terms
    .map(({ dimension, side }) => `${dimension}, ${side}`)
    .sort()
    .join(' + ');
}
