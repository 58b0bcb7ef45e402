'use client';
import { type RefObject, useCallback, useEffect, useLayoutEffect, useRef, useState } from 'react';

const ZOOM_MAX = 6;
/** How much one turn of the wheel, or one press of the glass, brings nearer. */
const WHEEL = 0.0015;
export const STEP = 1.5;
/** Marks are drawn anew for a new size once it rests; until then they grow with the photo. */
const REST_MS = 120;

interface Spot {
  clientX: number;
  clientY: number;
}
/** What must stay under the fingers: a place of the photo, as fractions, and where on the screen it belongs. */
interface Anchor extends Spot {
  x: number;
  y: number;
}

const anchorAt = (photo: DOMRect, spot: Spot): Anchor => ({
  ...spot,
  x: (spot.clientX - photo.left) / Math.max(1, photo.width),
  y: (spot.clientY - photo.top) / Math.max(1, photo.height),
});
const middleOf = ({ left, top, width, height }: DOMRect): Spot => ({
  clientX: left + width / 2,
  clientY: top + height / 2,
});

interface Pinch {
  distance: number;
  zoom: number;
  anchor: Anchor;
}
function fingers({ touches }: TouchEvent) {
  const [a, b] = [touches[0], touches[1]];
  if (!a || !b || touches.length !== 2) return null;
  const middle = { clientX: (a.clientX + b.clientX) / 2, clientY: (a.clientY + b.clientY) / 2 };
  return { distance: Math.hypot(a.clientX - b.clientX, a.clientY - b.clientY), middle };
}

/** The photo's size on the screen, followed at rest. */
function usePhotoSize(photo: RefObject<HTMLDivElement | null>, widthPx: number, heightPx: number) {
  const [size, setSize] = useState({ width: 400, height: (400 * heightPx) / widthPx });
  useEffect(() => {
    const element = photo.current;
    if (!element) return;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const measure = () => {
      const { width, height } = element.getBoundingClientRect();
      if (width > 0) setSize({ width, height });
    };
    const observer = new ResizeObserver(() => {
      clearTimeout(timer);
      timer = setTimeout(measure, REST_MS);
    });
    observer.observe(element);
    measure();
    return () => {
      clearTimeout(timer);
      observer.disconnect();
    };
  }, [photo]);
  return size;
}

interface Zooming {
  zoom: () => number;
  zoomBy: (factor: number, spot: Spot) => void;
  zoomTo: (zoom: number, anchor: Anchor) => void;
}

/** The wheel with Ctrl, and two fingers. They must be able to keep the page from zooming itself, which React's listeners cannot. */
function listenForZoom(frame: HTMLElement, photo: HTMLElement, { zoom, zoomBy, zoomTo }: Zooming) {
  let pinch: Pinch | null = null;
  const wheel = (event: WheelEvent) => {
    if (!event.ctrlKey) return;
    event.preventDefault();
    zoomBy(Math.exp(-event.deltaY * WHEEL), event);
  };
  const touch = (event: TouchEvent) => {
    const two = fingers(event);
    if (!two) return void (pinch = null);
    event.preventDefault();
    if (pinch)
      return zoomTo((pinch.zoom * two.distance) / pinch.distance, { ...pinch.anchor, ...two.middle });
    const anchor = anchorAt(photo.getBoundingClientRect(), two.middle);
    pinch = { distance: Math.max(1, two.distance), zoom: zoom(), anchor };
  };
  const stop = new AbortController();
  const options = { passive: false, signal: stop.signal };
  frame.addEventListener('wheel', wheel, options);
  frame.addEventListener('touchstart', touch, options);
  frame.addEventListener('touchmove', touch, options);
  frame.addEventListener('touchend', touch, options);
  return () => stop.abort();
}

/** Nearer and farther: two fingers, the wheel with Ctrl, buttons, keys. What lies under the fingers stays there. */
export function useViewport(widthPx: number, heightPx: number) {
  const scroller = useRef<HTMLDivElement | null>(null);
  const photo = useRef<HTMLDivElement | null>(null);
  const size = usePhotoSize(photo, widthPx, heightPx);
  const [zoom, setZoom] = useState(1);
  const held = useRef<Anchor | null>(null);
  const latest = useRef(zoom);

  const settle = useCallback(() => {
    const [anchor, element, frame] = [held.current, photo.current, scroller.current];
    held.current = null;
    if (!anchor || !element || !frame) return;
    const { left, top, width, height } = element.getBoundingClientRect();
    frame.scrollLeft += left + anchor.x * width - anchor.clientX;
    frame.scrollTop += top + anchor.y * height - anchor.clientY;
  }, []);
  useLayoutEffect(settle, [zoom, settle]);

  const zoomTo = useCallback(
    (next: number, anchor: Anchor | null) => {
      const within = Math.min(ZOOM_MAX, Math.max(1, next));
      held.current = anchor;
      // Two fingers that only wander do not change the zoom, and still take the photo along.
      if (within === latest.current) return settle();
      latest.current = within;
      setZoom(within);
    },
    [settle],
  );
  const zoomBy = useCallback(
    (factor: number, spot?: Spot) => {
      const [element, frame] = [photo.current, scroller.current];
      if (!element || !frame) return;
      const at = spot ?? middleOf(frame.getBoundingClientRect());
      zoomTo(latest.current * factor, anchorAt(element.getBoundingClientRect(), at));
    },
    [zoomTo],
  );

  useEffect(() => {
    const [frame, element] = [scroller.current, photo.current];
    if (frame && element)
      return listenForZoom(frame, element, { zoom: () => latest.current, zoomBy, zoomTo });
  }, [zoomBy, zoomTo]);

  const zoomOut = useCallback(() => zoomTo(1, null), [zoomTo]);
  return { scroller, photo, size, zoom, zoomBy, zoomOut };
}
