import { figureGarment, type FigureView } from '@/diagnosis/figure/figure';
import type { Proportions } from '@/diagnosis/figure/proportions';
import { cubicPath } from '@/diagnosis/figure/svg-path';
import type { DrawingSpace } from './drawing-space';

const INK = 'var(--ink, #16202e)';
const GRAPHITE = 'var(--graphite, #4a5360)';

/** Seams are thinner than the outline; stitching is dashed; a crease is a hair line. */
function seamStyle(name: string) {
  if (name.startsWith('crease')) return { stroke: GRAPHITE, strokeWidth: 0.75, strokeDasharray: '7 4 1.5 4' };
  if (name === 'fly') return { stroke: INK, strokeWidth: 1.1, strokeDasharray: '4 2.5' };
  if (name.startsWith('hem-stitching')) return { stroke: GRAPHITE, strokeWidth: 1, strokeDasharray: '4 2.5' };
  return { stroke: INK, strokeWidth: 1.35, strokeDasharray: undefined };
}

/** The trousers: one confident outline, seams, pocket, fly, band and hem. */
export function FigureTrousers(props: { view: FigureView; proportions: Proportions; space: DrawingSpace }) {
  const { view, proportions, space } = props;
  const { edges, seams } = figureGarment(view, proportions);
  const outline = edges.flatMap(({ segments }) => segments);
  return (
    <g strokeLinecap="round" strokeLinejoin="round">
      <path
        d={cubicPath(outline, space.place, true)}
        fill="var(--cloth, #efe6d3)"
        stroke={INK}
        strokeWidth={2.4}
        vectorEffect="non-scaling-stroke"
      />
      {seams.map(({ name, segments }) => (
        <path
          key={name}
          d={cubicPath(segments, space.place)}
          fill="none"
          vectorEffect="non-scaling-stroke"
          {...seamStyle(name)}
        />
      ))}
    </g>
  );
}
