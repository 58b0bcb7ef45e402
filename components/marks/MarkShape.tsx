import type { Mark } from './model/mark';
import { markStrokes } from './shapes';

interface Props {
  mark: Pick<Mark, 'kind' | 'severity' | 'points'>;
  widthPx: number;
  heightPx: number;
  /** Pixels of the master that one pixel of the screen takes. */
  unit: number;
  isSelected?: boolean;
}

/** Two edges, dark and light, carry every mark over white, black and denim alike. */
export function MarkShape({ mark, widthPx, heightPx, unit, isSelected }: Props) {
  const points = mark.points.map(({ x, y }) => ({ x: x * widthPx, y: y * heightPx }));
  const strokes = markStrokes(mark.kind, points, mark.severity, unit);
  const layer = (colour: string, more: number) =>
    strokes.map(({ d, width, dash }, i) => (
      <path
        key={`${colour} ${i}`}
        d={d}
        fill="none"
        stroke={colour}
        strokeWidth={width + more * unit}
        strokeDasharray={dash}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    ));
  return (
    <g>
      {layer('#10141c', isSelected ? 9 : 5)}
      {layer('#ffffff', isSelected ? 6 : 2.5)}
      {layer(mark.kind === 'tight' || mark.kind === 'pin' ? '#b01030' : '#0b4f7a', 0)}
    </g>
  );
}
