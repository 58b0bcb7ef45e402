import { useEffect, useRef } from 'react';
import type { PhotoPoint } from './model/mark';

interface Props {
  points: readonly PhotoPoint[];
  cross: PhotoPoint | null;
  widthPx: number;
  heightPx: number;
}

/** What is set so far, and the cross that keys move: dark with a light edge, on any cloth. */
export function DrawingAids({ points, cross, widthPx, heightPx }: Props) {
  const pixels = points.map(({ x, y }) => ({ x: x * widthPx, y: y * heightPx }));
  const line = pixels.map(({ x, y }) => `${x},${y}`).join(' ');
  return (
    <g fill="none" pointerEvents="none">
      <polyline points={line} stroke="#fffdf6" strokeWidth={5} />
      <polyline points={line} stroke="#10151c" strokeWidth={2} strokeDasharray="2 6" strokeLinecap="round" />
      {pixels.map(({ x, y }, i) => (
        <circle key={i} cx={x} cy={y} r={6} fill="#fffdf6" stroke="#10151c" strokeWidth={2.5} />
      ))}
      {cross ? <Cross x={cross.x * widthPx} y={cross.y * heightPx} /> : null}
    </g>
  );
}

function Cross({ x, y }: { x: number; y: number }) {
  const mark = useRef<SVGGElement | null>(null);
  // A cross that keys have moved out of sight takes the photo along.
  useEffect(() => {
    mark.current?.scrollIntoView?.({ block: 'nearest', inline: 'nearest' });
  }, [x, y]);
  const arms = `M${x - 18} ${y}H${x + 18}M${x} ${y - 18}V${y + 18}`;
  return (
    <g ref={mark}>
      <path d={arms} stroke="#fffdf6" strokeWidth={6} />
      <path d={arms} stroke="#10151c" strokeWidth={2.5} />
    </g>
  );
}
