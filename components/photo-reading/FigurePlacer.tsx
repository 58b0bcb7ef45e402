'use client';
import { type MouseEvent, type RefObject, useEffect, useRef, useState } from 'react';
import { photoSrcSet, photoUrl } from '@/components/photos/PhotoImage';
import { VIEW_WORDS } from '@/components/photos/view-words';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { LandmarkInput } from '@/db/queries/landmarks';
import type { PhotoDto } from '@/db/queries/photos';
import type { FigureView } from '@/diagnosis/figure/figure';
import { FIRST_TAPS, placementOf, shownPoints } from './figure-on-photo';
import { FigureOverlay } from './FigureOverlay';
import { LandmarkHandle, type Spot } from './LandmarkHandle';
import { landmarkWords } from './landmark-words';
import { Loupe } from './Loupe';

interface Props {
  photo: PhotoDto & { view: FigureView };
  tapped: readonly LandmarkInput[];
  message: string;
  /** True when they are kept. */
  onKeep: (landmarks: LandmarkInput[]) => Promise<boolean>;
  onClose: () => void;
}

/** Where the two first points stand when they are not tapped but moved by keys. */
const MIDDLE: readonly [Spot, Spot] = [
  { x: 0.5, y: 0.25 },
  { x: 0.5, y: 0.45 },
];
const rounded = (value: number) => Math.round(value * 1e6) / 1e6;

/** Lays the drawn figure over a photo: two taps place it, each point can be dragged, moved by keys, or chosen and tapped anew. */
export function FigurePlacer({ photo, tapped, message, onKeep, onClose }: Props) {
  const [points, setPoints] = useState<readonly LandmarkInput[]>(tapped);
  const [chosen, setChosen] = useState<string | null>(null);
  const [held, setHeld] = useState<Spot | null>(null);
  const surface = useRef<HTMLDivElement | null>(null);
  const size = useSize(surface);
  const src = photoUrl(photo.id, photo.revision, '1600');

  const wanted = FIRST_TAPS[photo.view].find((id) => !points.some(({ landmark }) => landmark === id));
  const next = chosen ?? wanted;
  const set = (landmark: string, { x, y }: Spot) =>
    setPoints((now) => [
      ...now.filter((one) => one.landmark !== landmark),
      { landmark, x: rounded(x), y: rounded(y) },
    ]);
  const tap = (event: MouseEvent<HTMLDivElement>) => {
    const frame = surface.current?.getBoundingClientRect();
    if (!frame || !next || frame.width === 0) return;
    set(next, {
      x: (event.clientX - frame.left) / frame.width,
      y: (event.clientY - frame.top) / frame.height,
    });
    setChosen(null);
  };
  const startInTheMiddle = () => FIRST_TAPS[photo.view].forEach((id, i) => set(id, MIDDLE[i]!));
  const keep = async () => {
    if (await onKeep([...points])) onClose();
  };
  const placement = placementOf(photo, points);
  const drawn = shownPoints(photo.view, placement, points);
  return (
    <section aria-label="Place the figure" className="grid gap-3">
      <p role="status" className="font-bold">
        {next
          ? `Tap the ${landmarkWords(next)} on the photo.`
          : 'The figure lies on the photo. Drag a point, or choose it and tap where it belongs.'}
      </p>
      <div className="relative mx-auto w-full bg-weave" style={{ maxWidth: `calc(78dvh * ${photo.widthPx / photo.heightPx})` }}>
        <div ref={surface} className="relative" style={{ aspectRatio: `${photo.widthPx} / ${photo.heightPx}` }} onClick={tap}>
          <img
            src={src}
            srcSet={photoSrcSet(photo.id, photo.revision)}
            sizes="(min-width: 64rem) 50vw, 100vw"
            alt={`${VIEW_WORDS[photo.view]}, to lay the figure on`}
            draggable={false}
            className="absolute inset-0 h-full w-full select-none"
          />
          {placement ? <FigureOverlay placement={placement} /> : null}
          {drawn.map(({ id, at, isSet }) => (
            <LandmarkHandle
              key={id}
              id={id}
              at={at}
              isSet={isSet}
              isChosen={id === chosen}
              size={size}
              onChoose={() => setChosen(id === chosen ? null : id)}
              onMove={(to) => set(id, to)}
              onHeld={setHeld}
            />
          ))}
        </div>
        {held ? <Loupe src={src} at={held} size={size} /> : null}
      </div>
      {message ? (
        <Notice tone="care" role="alert">
          {message}
        </Notice>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button look="chalk" onClick={() => void keep()} disabled={!placement}>
          Keep it there
        </Button>
        {points.length === 0 ? <Button onClick={startInTheMiddle}>Start in the middle</Button> : null}
        <Button onClick={() => setPoints([])} disabled={points.length === 0}>
          Take it off
        </Button>
        <Button onClick={onClose}>Leave it as it was</Button>
      </div>
    </section>
  ); // prettier-ignore
}

/** How large the photo is on the screen, in pixels. */
function useSize(element: RefObject<HTMLDivElement | null>) {
  const [size, setSize] = useState({ width: 400, height: 500 });
  useEffect(() => {
    const watched = element.current;
    if (!watched) return;
    const observer = new ResizeObserver(() => {
      const { width, height } = watched.getBoundingClientRect();
      if (width > 0) setSize({ width, height });
    });
    observer.observe(watched);
    return () => observer.disconnect();
  }, [element]);
  return size;
}
