'use client';
import { type KeyboardEvent, type PointerEvent, useRef, useState } from 'react';

const NEARER = 1.5;
const ZOOM_MAX = 6;
/** A press of an arrow moves by this share of what is in sight. */
const STEP = 0.1;

export interface LinkedView {
  zoom: number;
  /** The middle of what is in sight, as fractions of the frame. */
  x: number;
  y: number;
}

const WHOLE: LinkedView = { zoom: 1, x: 0.5, y: 0.5 };

/** Within the frame: nothing beside the photo comes into sight. */
export function withinFrame({ zoom, x, y }: LinkedView): LinkedView {
  const near = Math.min(ZOOM_MAX, Math.max(1, zoom));
  const clamp = (value: number) => Math.min(1 - 0.5 / near, Math.max(0.5 / near, value));
  return { zoom: near, x: clamp(x), y: clamp(y) };
}

/** The part of a frame of width 1 that is in sight, as a drawing's `viewBox` has it. */
export function viewBoxOf({ zoom, x, y }: LinkedView, height: number): string {
  return [x - 0.5 / zoom, (y - 0.5 / zoom) * height, 1 / zoom, height / zoom].join(' ');
}

const ARROWS: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
const ZOOMS: Record<string, number> = { '+': NEARER, '=': NEARER, '-': 1 / NEARER };

/** One zoom and one place for all panes: nearer, farther and aside by buttons, keys or dragging. */
export function useLinkedView() {
  const [view, setView] = useState(WHOLE);
  const grip = useRef<{ clientX: number; clientY: number; from: LinkedView } | null>(null);
  const zoomBy = (factor: number) => setView((now) => withinFrame({ ...now, zoom: now.zoom * factor }));
  const whole = () => setView(WHOLE);
  const moveBy = (dx: number, dy: number) =>
    setView((now) => withinFrame({ ...now, x: now.x + dx / now.zoom, y: now.y + dy / now.zoom }));

  const onKeyDown = (event: KeyboardEvent) => {
    const [way, zoom] = [ARROWS[event.key], ZOOMS[event.key]];
    if (!way && zoom === undefined && event.key !== '0') return;
    event.preventDefault();
    if (way) moveBy(way[0] * STEP, way[1] * STEP);
    else if (zoom !== undefined) zoomBy(zoom);
    else whole();
  };
  const onPointerDown = (event: PointerEvent<SVGSVGElement>) => {
    if (event.button !== 0 || view.zoom === 1) return;
    event.currentTarget.setPointerCapture?.(event.pointerId);
    grip.current = { clientX: event.clientX, clientY: event.clientY, from: view };
  };
  const onPointerMove = (event: PointerEvent<SVGSVGElement>) => {
    const held = grip.current;
    if (!held) return;
    const { width, height } = event.currentTarget.getBoundingClientRect();
    if (width === 0 || height === 0) return;
    const [dx, dy] = [(event.clientX - held.clientX) / width, (event.clientY - held.clientY) / height];
    const { from } = held;
    setView(withinFrame({ ...from, x: from.x - dx / from.zoom, y: from.y - dy / from.zoom }));
  };
  const letGo = () => {
    grip.current = null;
  };
  const events = { onKeyDown, onPointerDown, onPointerMove, onPointerUp: letGo, onPointerCancel: letGo };
  return { view, zoomBy, whole, events, nearer: NEARER };
}
