import { drawingSpace } from '@/components/figure/drawing-space';
import { Figure } from '@/components/figure/Figure';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import type { Measure } from '@/diagnosis/measuring/measures';
import { measureLine } from './measure-line';

/** The figure with a tape laid where one measure is taken. */
export function MeasureFigure({ measure }: { measure: Measure }) {
  const space = drawingSpace(measure.view, REFERENCE_PROPORTIONS);
  const [from, to] = measureLine(measure).map(space.place);
  const line = { x1: from!.x, y1: from!.y, x2: to!.x, y2: to!.y, vectorEffect: 'non-scaling-stroke' } as const; // prettier-ignore
  return (
    <div className="relative">
      <Figure
        view={measure.view}
        proportions={REFERENCE_PROPORTIONS}
        title={`Where to take it: ${measure.name}`}
        withTrousers={false}
        className="h-auto max-h-64 w-full"
      />
      <svg viewBox={space.viewBox} aria-hidden className="absolute inset-0 h-full max-h-64 w-full">
        <line {...line} stroke="var(--paper, #fffdf8)" strokeWidth={8} strokeLinecap="round" />
        <line {...line} stroke="var(--chalk, #1f5f8b)" strokeWidth={4} strokeLinecap="round" />
      </svg>
    </div>
  );
}
