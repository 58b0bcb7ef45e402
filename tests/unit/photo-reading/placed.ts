import { figureToPhoto, placeFigure, type FigurePlacement, type PhotoFrame } from '@/diagnosis/figure/align';
import type { FigureView } from '@/diagnosis/figure/figure';
import { landmarks } from '@/diagnosis/figure/figure';
import { figurePoint, photoPoint, type Side } from '@/diagnosis/figure/point';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import { bodyMark, type BodyMark, type DrawnKind } from '@/diagnosis/photo/body-mark';
import { readFigure } from '@/diagnosis/photo/read-figure';

type Place = [x: number, y: number];

/** A photo with the reference figure laid over it by its first and fourth landmark. */
export function placed(view: FigureView, over: Partial<PhotoFrame> = {}): FigurePlacement {
  const own = landmarks(view, REFERENCE_PROPORTIONS);
  const frame: PhotoFrame = { view, widthPx: 1500, heightPx: 2000, mirrored: false, ...over };
  const [top, low] = [own[0]!.at, own.at(-1)!.at];
  const placement = placeFigure(frame, [
    { figure: top, photo: photoPoint(0.5, 0.15) },
    { figure: low, photo: photoPoint(0.55, 0.9) },
  ]);
  if (placement === null) throw new Error('The figure was not placed');
  return placement;
}

interface Drawn {
  id?: string;
  kind?: DrawnKind;
  severity?: 1 | 2 | 3;
  side?: Side | 'both';
  frame?: Partial<PhotoFrame>;
}

/** A mark that was drawn on a photo over these places of the body, read back from it. */
export function drawnOver(view: FigureView, points: Place[], drawn: Drawn = {}): BodyMark {
  const { id = 'mark', kind = 'tight', severity = 2, side = 'both', frame = {} } = drawn;
  const placement = placed(view, frame);
  const onPhoto = points.map(([x, y]) => figureToPhoto(placement, figurePoint(x, y)));
  return bodyMark(readFigure(view, REFERENCE_PROPORTIONS), placement, {
    id,
    kind,
    severity,
    side,
    points: onPhoto,
  });
}
