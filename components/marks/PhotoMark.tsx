import { memo } from 'react';
import { MarkShape } from '@/components/marks-shapes/MarkShape';
import type { MarkStrength, PixelPoint } from '@/components/marks-shapes/mark-paths';
import type { Mark, MarkKind, MarkSeverity, PhotoPoint } from './model/mark';

export const STRENGTHS: Record<MarkSeverity, MarkStrength> = { 1: 'faint', 2: 'clear', 3: 'pulling' };

/** The cloth in a photo does not follow the theme, so neither do the marks on it: the inks of the light one, in both. */
export const PHOTO_INKS =
  '[--pin:#9b2335] [--chalk:#1d5a7d] [--basting:#7a4a00] [--ink:#1a2333] [--graphite:#4a5161]';

/** Pixels from the head of a pin to its point, down and to the side where there is room. */
const PIN_PX = 18;

/** The places that a mark's shape is drawn through, in pixels. A pin is drawn from the one place that it holds. */
export function shapePoints(
  kind: MarkKind,
  points: readonly PhotoPoint[],
  widthPx: number,
  heightPx: number,
): PixelPoint[] {
  const pixels = points.map(({ x, y }) => ({ x: x * widthPx, y: y * heightPx }));
  const [head] = pixels;
  if (kind !== 'pin' || !head || pixels.length > 1) return pixels;
  const room = (at: number, whole: number) => (at + PIN_PX > whole ? at - PIN_PX : at + PIN_PX);
  return [head, { x: room(head.x, widthPx), y: room(head.y, heightPx) }];
}

interface Props {
  mark: Pick<Mark, 'kind' | 'severity' | 'points'>;
  /** The photo's size in the pixels that the shape is drawn in. */
  widthPx: number;
  heightPx: number;
  /** What a screen reader says; left out, the shape is decoration. */
  label?: string;
  isSelected?: boolean;
}

/** A mark on a photo, in our own shapes, with edges that show on white, black and denim. Drawn again only when it changes. */
export const PhotoMark = memo(function PhotoMark({ mark, widthPx, heightPx, label, isSelected }: Props) {
  const points = shapePoints(mark.kind, mark.points, widthPx, heightPx);
  return (
    <g>
      {isSelected ? (
        <polyline
          points={points.map(({ x, y }) => `${x},${y}`).join(' ')}
          fill="none"
          stroke="#ffd54a"
          strokeOpacity={0.75}
          strokeWidth={20}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ) : null}
      <MarkShape
        kind={mark.kind}
        points={points}
        strength={STRENGTHS[mark.severity]}
        {...(label === undefined ? {} : { label })}
      />
    </g>
  );
});
