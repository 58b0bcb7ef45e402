'use client';
import { type PointerEvent, type RefObject, useRef, useState } from 'react';
import { type Mark, moveMark, movePoint, type PhotoPoint } from './model/mark';
import { markText } from './model/mark-text';
import { PhotoMark } from './PhotoMark';
import { pointOf } from './useDrawing';

interface Props {
  mark: Mark;
  surface: RefObject<SVGSVGElement | null>;
  widthPx: number;
  heightPx: number;
  /** While something is being drawn a line may begin where another ends, so the handles let it through. */
  isHeld: boolean;
  onMoved: (mark: Mark) => void;
}

/** More bends than these are moved with the whole line; a handle on each would hide it. */
const HANDLES_MAX = 8;

/** Pixels around a point within which it is held. */
const HOLD_PX = 18;

const handlesOf = ({ points }: Mark): number[] =>
  points.length <= HANDLES_MAX ? points.map((_, i) => i) : [0, points.length - 1];

/** The mark in hand: moved whole by its line, or by one of its points. Arrow keys and the list beside the photo do the same. */
export function MarkHandles({ mark, surface, widthPx, heightPx, isHeld, onMoved }: Props) {
  const grip = useRef<{ from: PhotoPoint; index: number | null; moved: Mark } | null>(null);
  const [moved, setMoved] = useState<Mark | null>(null);
  const shown = moved ?? mark;
  const grab = (event: PointerEvent<SVGElement>, index: number | null) => {
    const from = surface.current && pointOf(surface.current, event);
    if (!from || event.button !== 0) return;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    grip.current = { from, index, moved: mark };
  };
  const drag = (event: PointerEvent<SVGElement>) => {
    const held = grip.current;
    const to = surface.current && pointOf(surface.current, event);
    if (!held || !to) return;
    held.moved =
      held.index === null
        ? moveMark(mark, to.x - held.from.x, to.y - held.from.y)
        : movePoint(mark, held.index, to);
    setMoved(held.moved);
  };
  const letGo = () => {
    grip.current = null;
    setMoved(null);
  };
  const drop = () => {
    if (grip.current) onMoved(grip.current.moved);
    letGo();
  };
  const moves = {
    onPointerMove: drag,
    onPointerUp: drop,
    onPointerCancel: letGo,
    // A click that ends a move is not a choice of what lies beneath.
    onClick: (event: { stopPropagation: () => void }) => event.stopPropagation(),
  };
  return (
    <g className="touch-none" pointerEvents={isHeld ? undefined : 'none'}>
      <g className="cursor-move" onPointerDown={(event) => grab(event, null)} {...moves}>
        <PhotoMark mark={shown} widthPx={widthPx} heightPx={heightPx} label={markText(shown)} isSelected />
      </g>
      {handlesOf(shown).map((index) => {
        const point = shown.points[index];
        return point && isHeld ? (
          <g key={index} className="cursor-grab" onPointerDown={(event) => grab(event, index)} {...moves}>
            <circle cx={point.x * widthPx} cy={point.y * heightPx} r={HOLD_PX} fill="transparent" />
            <circle
              cx={point.x * widthPx}
              cy={point.y * heightPx}
              r={7}
              fill="#fffdf6"
              stroke="#10151c"
              strokeWidth={3}
            />
          </g>
        ) : null;
      })}
    </g>
  );
}
