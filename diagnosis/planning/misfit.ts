import { GRID_SIZE, zAt } from '../inference/grid';
import type { Layout } from '../inference/layout';

/**
 * Expected misfit that is left when a need's belief is moved by `byZ`, in tolerances: nothing inside the tolerance, then
 * linear, steeper on the side that is harder to mend.
 */
export function expectedMisfit(layout: Layout, dimension: number, belief: Float64Array, byZ: number): number {
  const { loss } = layout.index.knowledge.dimensions[dimension]!;
  const edge = layout.toleranceMm[dimension]! / layout.scaleMm[dimension]!;
  let sum = 0;
  for (let bin = 0; bin < GRID_SIZE; bin++) {
    const z = zAt(bin) + byZ;
    if (z > edge) sum += belief[bin]! * loss.more * (z - edge);
    else if (z < -edge) sum += belief[bin]! * loss.less * (-z - edge);
  }
  return sum / edge;
}
