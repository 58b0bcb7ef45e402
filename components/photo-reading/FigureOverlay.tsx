import { PHOTO_INKS } from '@/components/marks/PhotoMark';
import { figureToPhoto, type FigurePlacement } from '@/diagnosis/figure/align';
import { garmentPolygon } from '@/diagnosis/figure/figure';
import type { FigurePoint } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';

/** The drawn garment over the photo that it is laid on: a two-tone line, so that it shows on white, black and denim. */
export function FigureOverlay({ placement }: { placement: FigurePlacement }) {
  const { widthPx, heightPx, view } = placement.frame;
  const corner = (point: FigurePoint) => {
    const { x, y } = figureToPhoto(placement, point);
    return `${(x * widthPx).toFixed(1)} ${(y * heightPx).toFixed(1)}`;
  };
  const d = `M${garmentPolygon(view, REFERENCE_PROPORTIONS).map(corner).join('L')}Z`;
  return (
    <svg
      viewBox={`0 0 ${widthPx} ${heightPx}`}
      preserveAspectRatio="none"
      aria-hidden
      className={`pointer-events-none absolute inset-0 h-full w-full ${PHOTO_INKS}`}
    >
      <path d={d} fill="none" stroke="#fffdf6" strokeWidth={5} vectorEffect="non-scaling-stroke" />
      <path d={d} fill="none" stroke="#10151c" strokeWidth={2} vectorEffect="non-scaling-stroke" strokeDasharray="10 5" />
    </svg>
  ); // prettier-ignore
}
