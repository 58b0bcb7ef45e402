import { bareOutline, bodyShapes, type BodyPart } from '@/diagnosis/figure/body';
import {
  footLines,
  formLines,
  handLines,
  kneeLines,
  underwearOutline,
} from '@/diagnosis/figure/body-details';
import type { FigureView } from '@/diagnosis/figure/figure';
import type { Proportions } from '@/diagnosis/figure/proportions';
import { cubicPath } from '@/diagnosis/figure/svg-path';
import type { DrawingSpace } from './drawing-space';

type Props = { view: FigureView; proportions: Proportions; space: DrawingSpace };

const BODY_LINE = { stroke: 'var(--graphite, #4a5360)', strokeWidth: 1.6 } as const;
const FINE_LINE = { stroke: 'var(--graphite, #4a5360)', strokeWidth: 1, fill: 'none' } as const;

/** Some parts of the bare figure, drawn in paper with a thinner line than the garment. */
export function BodyParts({ view, proportions, space, parts }: Props & { parts: readonly BodyPart[] }) {
  return bodyShapes(view, proportions)
    .filter(({ part }) => parts.includes(part))
    .map(({ part, segments }, index) => (
      <path
        key={`${part}-${index}`}
        d={cubicPath(segments, space.place, true)}
        fill="var(--paper, #fffdf8)"
        vectorEffect="non-scaling-stroke"
        {...BODY_LINE}
      />
    ));
}

/** Fingers and toes of a standing figure. */
export function BodyLines({ view, proportions, space }: Props) {
  if (view !== 'front' && view !== 'back') return null;
  const strokes = [...handLines(proportions), ...footLines(view, proportions)];
  return strokes.map((segments, index) => (
    <path
      key={index}
      d={cubicPath(segments, space.place)}
      strokeLinecap="round"
      vectorEffect="non-scaling-stroke"
      {...FINE_LINE}
    />
  ));
}

/** A standing body without trousers, plainly covered at the hip. Seen from the side a figure always wears them. */
export function BareBody({ view, proportions, space }: Props) {
  if (view !== 'front' && view !== 'back') return null;
  return (
    <>
      <path
        d={cubicPath(bareOutline(view, proportions), space.place, true)}
        fill="var(--paper, #fffdf8)"
        vectorEffect="non-scaling-stroke"
        {...BODY_LINE}
      />
      <path
        d={cubicPath(underwearOutline(proportions), space.place, true)}
        fill="var(--cloth, #efe6d3)"
        vectorEffect="non-scaling-stroke"
        {...BODY_LINE}
      />
      {kneeLines(view, proportions).map((segments, index) => (
        <path
          key={index}
          d={cubicPath(segments, space.place)}
          strokeLinecap="round"
          vectorEffect="non-scaling-stroke"
          {...FINE_LINE}
        />
      ))}
    </>
  );
}

/** Light lines that round the cloth over the body. */
export function FormLines({ view, proportions, space }: Props) {
  return formLines(view, proportions).map((segments, index) => (
    <path
      key={index}
      d={cubicPath(segments, space.place)}
      strokeLinecap="round"
      opacity={0.55}
      vectorEffect="non-scaling-stroke"
      {...FINE_LINE}
    />
  ));
}
