import { markPaths, type PixelPoint } from '@/components/marks-shapes/mark-paths';
import type { MarkKind } from './model/mark';

const ENDS: Record<MarkKind, [PixelPoint, PixelPoint]> = {
  tight: [{ x: 9, y: 39 }, { x: 43, y: 13 }],
  slack: [{ x: 6, y: 34 }, { x: 46, y: 18 }],
  gap: [{ x: 8, y: 18 }, { x: 44, y: 18 }],
  pooling: [{ x: 6, y: 26 }, { x: 46, y: 26 }],
  tilt: [{ x: 2, y: 30 }, { x: 50, y: 22 }],
  pin: [{ x: 16, y: 16 }, { x: 36, y: 36 }],
}; // prettier-ignore

/** The shape that a kind has on the photo, in the ink of the text beside it. */
export function KindIcon({ kind }: { kind: MarkKind }) {
  return (
    <svg viewBox="0 0 52 52" width="30" height="30" aria-hidden>
      {markPaths(kind, ENDS[kind], 'pulling').map(({ d, width, dash, isFilled }, i) => (
        <path
          key={i}
          d={d}
          fill={isFilled ? 'currentColor' : 'none'}
          stroke="currentColor"
          strokeWidth={width}
          strokeDasharray={dash?.join(' ')}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ))}
    </svg>
  );
}
