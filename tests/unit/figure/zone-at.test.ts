import { describe, expect, it } from 'vitest';
import { figureZones, zoneAt } from '@/diagnosis/figure/figure';
import { figurePoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';

describe('the zone under a finger', () => {
  it('is the one whose middle is touched, and none beside the figure', () => {
    for (const { zone, side, polygon } of figureZones('front', REFERENCE_PROPORTIONS)) {
      const middle = polygon.reduce(
        (sum, { x, y }) => ({ x: sum.x + x / polygon.length, y: sum.y + y / polygon.length }),
        { x: 0, y: 0 },
      );
      const found = zoneAt('front', REFERENCE_PROPORTIONS, figurePoint(middle.x, middle.y));
      // A hollow zone may not hold its own middle; then a neighbour does.
      expect(found, zone).not.toBeNull();
      if (found?.zone === zone) expect(found.side).toBe(side);
    }
    expect(zoneAt('front', REFERENCE_PROPORTIONS, figurePoint(9, 9))).toBeNull();
  });
});
