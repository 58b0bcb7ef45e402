'use client';
import { type PointerEvent, type RefObject, useRef, useState } from 'react';
import { type Mark, type MarkKind, type PhotoPoint, photoPoint } from './model/mark';
import { simplify } from './model/simplify';

export type Tool = MarkKind | 'look';

interface Options {
  surface: RefObject<SVGSVGElement | null>;
  ink: RefObject<SVGPathElement | null>;
  tool: Tool;
  widthPx: number;
  heightPx: number;
  onDrawn: (points: PhotoPoint[]) => void;
}

const TAP_PX = 8;
const TOLERANCE_PX = 1.5;

interface Stroke {
  pointerId: number;
  points: { x: number; y: number }[];
}

/** Where an event lies on the photo, whatever the zoom. */
export function pointOf(surface: SVGSVGElement, event: { clientX: number; clientY: number }): PhotoPoint {
  const box = surface.getBoundingClientRect();
  return photoPoint((event.clientX - box.left) / box.width, (event.clientY - box.top) / box.height);
}

/**
 * Draws with finger, pen or mouse: a stroke is a line, two taps are its ends, one tap is a pin. Ink goes straight into the path
 * element, past React, so that it follows the pointer within the frame.
 */
export function useDrawing({ surface, ink, tool, widthPx, heightPx, onDrawn }: Options) {
  const stroke = useRef<Stroke | null>(null);
  const hasPen = useRef(false);
  const [firstTap, setFirstTap] = useState<PhotoPoint | null>(null);

  const clear = () => {
    stroke.current = null;
    ink.current?.setAttribute('d', '');
  };

  const tapped = (point: PhotoPoint) => {
    if (tool === 'pin') return onDrawn([point]);
    if (!firstTap) return setFirstTap(point);
    setFirstTap(null);
    onDrawn([firstTap, point]);
  };

  const onPointerDown = (event: PointerEvent<SVGSVGElement>) => {
    if (tool === 'look' || event.button !== 0) return;
    if (event.pointerType === 'pen') hasPen.current = true;
    // Once a pen was seen, a finger is the hand that holds it. A second finger ends a stroke: it was a pinch.
    if (event.pointerType === 'touch' && hasPen.current) return;
    if (stroke.current) return clear();
    event.currentTarget.setPointerCapture(event.pointerId);
    stroke.current = { pointerId: event.pointerId, points: [pointOf(event.currentTarget, event)] };
  };

  const onPointerMove = (event: PointerEvent<SVGSVGElement>) => {
    const now = stroke.current;
    if (!now || now.pointerId !== event.pointerId || !surface.current) return;
    for (const one of event.nativeEvent.getCoalescedEvents?.() ?? [event.nativeEvent]) {
      now.points.push(pointOf(surface.current, one));
    }
    ink.current?.setAttribute(
      'd',
      now.points.map(({ x, y }, i) => `${i === 0 ? 'M' : 'L'}${x * widthPx} ${y * heightPx}`).join(''),
    );
  };

  const onPointerUp = (event: PointerEvent<SVGSVGElement>) => {
    const now = stroke.current;
    if (!now || now.pointerId !== event.pointerId) return;
    clear();
    const box = event.currentTarget.getBoundingClientRect();
    const onScreen = now.points.map(({ x, y }) => ({ x: x * box.width, y: y * box.height }));
    const start = onScreen[0]!;
    const reach = Math.max(...onScreen.map(({ x, y }) => Math.hypot(x - start.x, y - start.y)));
    const first = now.points[0]!;
    if (reach < TAP_PX) return tapped(photoPoint(first.x, first.y));
    setFirstTap(null);
    const line = simplify(onScreen, TOLERANCE_PX).map(({ x, y }) =>
      photoPoint(x / box.width, y / box.height),
    );
    onDrawn(tool === 'pin' ? line.slice(0, 1) : line.slice(0, 400));
  };

  return {
    firstTap,
    forgetTap: () => setFirstTap(null),
    handlers: { onPointerDown, onPointerMove, onPointerUp, onPointerCancel: clear },
  };
}

export const newMark = (
  id: string,
  kind: MarkKind,
  severity: Mark['severity'],
  points: PhotoPoint[],
): Mark => ({
  id,
  kind,
  severity,
  side: 'both',
  points,
  note: '',
});
