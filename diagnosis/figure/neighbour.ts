type XY = { readonly x: number; readonly y: number };
export type Heading = 'up' | 'down' | 'left' | 'right';

const HEADINGS: Record<Heading, XY> = {
  up: { x: 0, y: -1 },
  down: { x: 0, y: 1 },
  left: { x: -1, y: 0 },
  right: { x: 1, y: 0 },
};
const ASIDE_COST = 2.2;

/**
 * The place to go to from one of several places with an arrow key: the nearest that lies ahead, straying aside costing
 * more than going on. The same index where nothing lies ahead.
 */
export function neighbourIndex(places: readonly XY[], from: number, heading: Heading): number {
  const [start, way] = [places[from]!, HEADINGS[heading]];
  let best = { index: from, cost: Infinity };
  places.forEach((place, index) => {
    const [dx, dy] = [place.x - start.x, place.y - start.y];
    const ahead = dx * way.x + dy * way.y;
    const aside = Math.abs(dx * way.y - dy * way.x);
    if (index === from || ahead <= 1e-6 || aside > 3 * ahead) return;
    const cost = ahead + ASIDE_COST * aside;
    if (cost < best.cost) best = { index, cost };
  });
  return best.index;
}
