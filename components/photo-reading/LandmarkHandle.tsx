'use client';
import { type KeyboardEvent, type PointerEvent, useRef } from 'react';
import { join } from '@/components/ui/styles';
import { landmarkWords } from './landmark-words';

export interface Spot {
  x: number;
  y: number;
}

interface Props {
  id: string;
  at: Spot;
  /** Set by hand, or only where the drawing puts it. */
  isSet: boolean;
  isChosen: boolean;
  /** The photo on the screen, in pixels. */
  size: { width: number; height: number };
  onChoose: () => void;
  onMove: (to: Spot) => void;
  /** Called while it is dragged, and with null when it is let go. */
  onHeld: (at: Spot | null) => void;
}

const ARROWS: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
const COARSE_PX = 10;
const within = (value: number) => Math.min(1, Math.max(0, value));

/** One point of the figure on the photo: dragged, moved with the arrows (with Shift ten times as far), or chosen and set by a tap. */
export function LandmarkHandle({ id, at, isSet, isChosen, size, onChoose, onMove, onHeld }: Props) {
  const grip = useRef<{ clientX: number; clientY: number; from: Spot; to: Spot } | null>(null);
  const moved = (clientX: number, clientY: number): Spot | null => {
    const held = grip.current;
    if (!held) return null;
    const [dx, dy] = [(clientX - held.clientX) / size.width, (clientY - held.clientY) / size.height];
    return { x: within(held.from.x + dx), y: within(held.from.y + dy) };
  };
  const onPointerDown = (event: PointerEvent<HTMLButtonElement>) => {
    if (event.button !== 0) return;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    grip.current = { clientX: event.clientX, clientY: event.clientY, from: at, to: at };
  };
  const onPointerMove = (event: PointerEvent<HTMLButtonElement>) => {
    const to = moved(event.clientX, event.clientY);
    if (!to || !grip.current) return;
    grip.current.to = to;
    onHeld(to);
  };
  const drop = () => {
    const held = grip.current;
    grip.current = null;
    onHeld(null);
    if (held && (held.to.x !== held.from.x || held.to.y !== held.from.y)) onMove(held.to);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const way = ARROWS[event.key];
    if (!way) return;
    event.preventDefault();
    const by = event.shiftKey ? COARSE_PX : 1;
    onMove({ x: within(at.x + (way[0] * by) / size.width), y: within(at.y + (way[1] * by) / size.height) });
  };
  return (
    <button
      type="button"
      aria-pressed={isChosen}
      aria-label={`${landmarkWords(id)}${isSet ? '' : ', not set by hand'}`}
      onClick={(event) => {
        event.stopPropagation();
        onChoose();
      }}
      onPointerDown={onPointerDown}
      onPointerMove={onPointerMove}
      onPointerUp={drop}
      onPointerCancel={drop}
      onKeyDown={onKeyDown}
      style={{ left: `${at.x * 100}%`, top: `${at.y * 100}%` }}
      className="absolute grid size-6 -translate-1/2 cursor-grab touch-none place-items-center rounded-full focus-visible:outline-3 focus-visible:outline-chalk"
    >
      <span
        className={join(
          'block rounded-full border-[3px] border-[#10151c] outline-2 outline-[#fffdf6]',
          isSet ? 'size-4 bg-[#fffdf6]' : 'size-3 bg-[#10151c]/40',
          isChosen && 'bg-chalk',
        )}
      />
    </button>
  );
}
