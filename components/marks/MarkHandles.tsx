'use client';
import { type PointerEvent, type RefObject, useRef } from 'react';
import { type Mark, moveMark, movePoint, type PhotoPoint } from './model/mark';
import { MarkShape } from './MarkShape';
import { pointOf } from './useDrawing';

interface Props {
  mark: Mark;
  surface: RefObject<SVGSVGElement | null>;
  widthPx: number;
  heightPx: number;
  unit: number;
  onMoved: (mark: Mark) => void;
  /** What is shown while it is being moved. */
  onMoving: (mark: Mark | null) => void;
}

/** The mark in hand: dragged whole by its line, or by one of its ends. Arrow keys do the same. */
export function MarkHandles({ mark, surface, widthPx, heightPx, unit, onMoved, onMoving }: Props) {
  const grip = useRef<{ from: PhotoPoint; index: number | null; moved: Mark } | null>(null);
  const grab = (event: PointerEvent<SVGElement>, index: number | null) => {
    if (!surface.current) return;
    event.stopPropagation();
    event.currentTarget.setPointerCapture(event.pointerId);
    grip.current = { from: pointOf(surface.current, event), index, moved: mark };
  };
  const drag = (event: PointerEvent<SVGElement>) => {
    const held = grip.current;
    if (!held || !surface.current) return;
    const to = pointOf(surface.current, event);
    held.moved =
      held.index === null
        ? moveMark(mark, to.x - held.from.x, to.y - held.from.y)
        : movePoint(mark, held.index, to);
    onMoving(held.moved);
  };
  const drop = () => {
    const held = grip.current;
    grip.current = null;
    onMoving(null);
    if (held) onMoved(held.moved);
  };
  const moves = { onPointerMove: drag, onPointerUp: drop, onPointerCancel: drop };
  const ends = mark.points.length === 1 ? [0] : [0, mark.points.length - 1];
  return (
    <g className="touch-none">
      <g className="cursor-move" onPointerDown={(event) => grab(event, null)} {...moves}>
        <MarkShape mark={mark} widthPx={widthPx} heightPx={heightPx} unit={unit} isSelected />
      </g>
      {ends.map((index) => {
        const point = mark.points[index];
        return point ? (
          <circle
            key={index}
            cx={point.x * widthPx}
            cy={point.y * heightPx}
            r={13 * unit}
            fill="#ffffff88"
            stroke="#10141c"
            strokeWidth={3 * unit}
            className="cursor-grab"
            onPointerDown={(event) => grab(event, index)}
            {...moves}
          />
        ) : null;
      })}
    </g>
  );
}
