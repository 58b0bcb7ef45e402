'use client';
import { type PointerEvent, type RefObject, useEffect, useRef } from 'react';
import { type Ink, inkOn } from './ink';
import { type PhotoPoint, photoPoint } from './model/mark';
import { isTap, lineOf } from './model/stroke';

interface Options {
  /** What is drawn on: covers the photo whatever the zoom. */
  surface: RefObject<SVGSVGElement | null>;
  /** What the wet ink lies on: covers the part of the photo that is in sight. */
  wet: RefObject<HTMLCanvasElement | null>;
  isOn: boolean;
  onLine: (points: PhotoPoint[]) => void;
  onTap: (point: PhotoPoint) => void;
}

interface Stroke {
  pointerId: number;
  /** Pixels from the upper left of the photo. */
  pixels: { x: number; y: number }[];
  photo: DOMRect;
  ink: Ink;
  stop: () => void;
}

/** Where an event lies on the photo, whatever the zoom; null while the photo has no size. */
export function pointOf(
  surface: SVGSVGElement,
  event: { clientX: number; clientY: number },
): PhotoPoint | null {
  const { left, top, width, height } = surface.getBoundingClientRect();
  if (width === 0 || height === 0) return null;
  return photoPoint((event.clientX - left) / width, (event.clientY - top) / height);
}

/** The earliest word of a moving pointer that this browser gives. */
const movesEarly = () => ('onpointerrawupdate' in window ? 'pointerrawupdate' : 'pointermove');

const eachOf = (event: globalThis.PointerEvent) => {
  const all = event.getCoalescedEvents?.() ?? [];
  return all.length > 0 ? all : [event];
};

/**
 * Draws with finger, pen or mouse: a stroke is a line, a touch without a way is a tap. While a stroke lasts nothing is measured
 * and nothing of the page is drawn again.
 */
export function useDrawing({ surface, wet, isOn, onLine, onTap }: Options) {
  const stroke = useRef<Stroke | null>(null);
  const hasPen = useRef(false);

  const drop = () => {
    stroke.current?.stop();
    stroke.current?.ink.end();
    stroke.current = null;
  };
  useEffect(() => drop, []);

  const begin = (event: PointerEvent<SVGSVGElement>) => {
    const [element, canvas] = [surface.current, wet.current];
    if (!element || !canvas) return;
    const photo = element.getBoundingClientRect();
    const { left, top } = canvas.getBoundingClientRect();
    if (photo.width === 0 || photo.height === 0) return;
    const ink = inkOn(canvas);
    const pixels: Stroke['pixels'] = [];
    const add = (events: readonly { clientX: number; clientY: number }[]) => {
      for (const { clientX, clientY } of events)
        pixels.push({ x: clientX - photo.left, y: clientY - photo.top });
      ink.extend(events.map(({ clientX, clientY }) => ({ x: clientX - left, y: clientY - top })));
    };
    const move = (moved: Event) => {
      if (moved instanceof PointerEvent && moved.pointerId === event.pointerId) add(eachOf(moved));
    };
    const name = movesEarly();
    element.addEventListener(name, move);
    element.setPointerCapture?.(event.pointerId);
    const stop = () => element.removeEventListener(name, move);
    ink.begin();
    stroke.current = { pointerId: event.pointerId, pixels, photo, ink, stop };
    add([event]);
  };

  const onPointerDown = (event: PointerEvent<SVGSVGElement>) => {
    if (event.pointerType === 'pen') hasPen.current = true;
    if (!isOn || event.button !== 0) return;
    // Once a pen was seen, a finger is the hand that holds it. A second finger makes a pinch of what was a stroke.
    if (event.pointerType === 'touch' && hasPen.current) return;
    if (stroke.current) return drop();
    begin(event);
  };

  const onPointerUp = (event: PointerEvent<SVGSVGElement>) => {
    const now = stroke.current;
    if (!now || now.pointerId !== event.pointerId) return;
    drop();
    const { pixels, photo } = now;
    pixels.push({ x: event.clientX - photo.left, y: event.clientY - photo.top });
    const [first] = pixels;
    if (!first || isTap(pixels)) return onTap(photoPoint((first?.x ?? 0) / photo.width, (first?.y ?? 0) / photo.height)); // prettier-ignore
    onLine(lineOf(pixels, photo));
  };

  const onPointerCancel = (event: PointerEvent<SVGSVGElement>) => {
    if (stroke.current?.pointerId === event.pointerId) drop();
  };

  return { onPointerDown, onPointerUp, onPointerCancel };
}
