import { describe, expect, it } from 'vitest';
import { drawnOver } from './placed';

const FORK_TO_LEFT_HIP: [number, number][] = [[0.05, 0.98], [0.35, 0.78]]; // prettier-ignore
const mirrored = (points: [number, number][]) => points.map(([x, y]): [number, number] => [-x, y]);

describe('a mark on the body', () => {
  it('knows where it lies, which way it runs, how long it is and what it starts at', () => {
    const mark = drawnOver('front', FORK_TO_LEFT_HIP);
    expect(mark.side).toBe('left');
    expect(mark.length).toBeCloseTo(Math.hypot(0.3, 0.2), 6);
    // From the hip down to the fork it runs inward: 180 − 56.3 degrees from plumb.
    expect(mark.angleDeg).toBeCloseTo(180 - (Math.atan2(0.3, 0.2) * 180) / Math.PI, 4);
    expect(mark.ends[0].name).toBe('fork');
    expect(mark.zones.map(({ zone }) => zone)).toContain('fork-front');
  });

  it('reads the same on either leg, whichever way it was drawn', () => {
    const [left, right] = [
      drawnOver('front', FORK_TO_LEFT_HIP),
      drawnOver('front', mirrored(FORK_TO_LEFT_HIP)),
    ];
    const turned = drawnOver('front', [...FORK_TO_LEFT_HIP].reverse());
    expect(right.side).toBe('right');
    expect(right.angleDeg).toBeCloseTo(left.angleDeg!, 6);
    expect(turned.angleDeg).toBeCloseTo(left.angleDeg!, 6);
    expect(right.zones.map(({ zone }) => zone)).toEqual(left.zones.map(({ zone }) => zone));
  });

  it('keeps the wearer’s side in a mirror photo, and the side that the person said before that', () => {
    expect(drawnOver('front', FORK_TO_LEFT_HIP, { frame: { mirrored: true } }).side).toBe('left');
    expect(drawnOver('back', FORK_TO_LEFT_HIP, { frame: { mirrored: true } }).side).toBe('left');
    expect(drawnOver('front', FORK_TO_LEFT_HIP, { side: 'right' }).side).toBe('right');
  });

  it('leaves the side open on the centre line, and takes it from a photo of one side', () => {
    expect(drawnOver('front', [[0, 0.7], [0, 0.95]]).side).toBeNull(); // prettier-ignore
    expect(drawnOver('left', [[0, 0.7], [0.1, 0.95]]).side).toBe('left'); // prettier-ignore
  });

  it('does not turn with the camera, nor with the shape of the picture', () => {
    const [tall, wide] = [drawnOver('back', FORK_TO_LEFT_HIP), drawnOver('back', FORK_TO_LEFT_HIP, { frame: { widthPx: 2000, heightPx: 1200 } })]; // prettier-ignore
    expect(wide.angleDeg).toBeCloseTo(tall.angleDeg!, 6);
    expect(wide.length).toBeCloseTo(tall.length, 6);
  });

  it('counts from the side toward the back, and from either half toward the seam', () => {
    const behind = drawnOver('left', [[-0.3, 0.4], [-0.15, 0.6]]); // prettier-ignore
    expect(behind.angleDeg).toBeCloseTo(180 - (Math.atan2(0.15, 0.2) * 180) / Math.PI, 4);
    expect(behind.seamwardDeg).toBeCloseTo((Math.atan2(0.15, 0.2) * 180) / Math.PI, 4);
  });

  it('has no direction as a pin, and no zone off the garment', () => {
    const pin = drawnOver('front', [[3, 0.5]], { kind: 'pin' });
    expect(pin.angleDeg).toBeNull();
    expect(pin.zones).toEqual([]);
  });
});
