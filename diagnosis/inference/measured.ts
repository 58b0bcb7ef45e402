import type { Measured, Side } from '../case-schema';
import { addGaussian } from './checks';
import type { Draft } from './draft';
import { variablesFor } from './layout';
import type { Layout } from './layout';

/** Sums of three and more needs are passed as messages, which hold only while the sum is known no better than this, mm. */
const LONG_SUM_SD_MM = 18;

/**
 * Adds a measured sum of needs. Where one of its needs is split and the measure has no side, each leg is measured once:
 * two copies with √2 times the error say as much as one.
 */
export function addMeasured(draft: Draft, layout: Layout, measured: Measured): void {
  const dimensions = measured.terms.map(({ dimension }) => layout.index.dimensions.get(dimension)!);
  const open = measured.terms.some(
    ({ side }, i) => side === 'both' && layout.ofDimension[dimensions[i]!]!.length > 1,
  );
  const sides: Side[] = open ? ['left', 'right'] : ['both'];
  const sdMm = measured.sdMm * Math.sqrt(sides.length);
  for (const copy of sides) {
    const terms = measured.terms.map(({ weight, side }, i) => {
      const dimension = dimensions[i]!;
      const variable = variablesFor(layout, dimension, side === 'both' ? copy : side)[0]!;
      return { variable, perZ: weight * layout.scaleMm[dimension]! };
    });
    addSum(draft, layout, terms, measured.needMm, sdMm);
  }
}

function addSum(
  draft: Draft,
  layout: Layout,
  terms: { variable: number; perZ: number }[],
  meanMm: number,
  sdMm: number,
): void {
  if (terms.length === 1) {
    const { variable, perZ } = terms[0]!;
    addGaussian(draft, variable, meanMm / perZ, sdMm / Math.abs(perZ));
    return;
  }
  const least = terms.length > 2 ? LONG_SUM_SD_MM * layout.factors.length : 0;
  draft.sums.push({ terms, meanMm, sdMm: Math.max(least, sdMm) });
}

/** The needs of a measured sum, whatever their order: what makes two measurements the same one. */
export function termsKey({ terms }: Measured): string {
  return terms
    .map(({ dimension, side }) => `${dimension}, ${side}`)
    .sort()
    .join(' + ');
}
