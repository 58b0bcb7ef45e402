'use client';
import type { ComponentProps, ReactNode, RefObject } from 'react';
import { join } from '@/components/ui/styles';
import { PHOTO_INKS } from './PhotoMark';

export interface CanvasPhoto {
  src: string;
  srcSet: string;
  widthPx: number;
  heightPx: number;
  alt: string;
}

interface Props {
  photo: CanvasPhoto;
  scrollerRef: RefObject<HTMLDivElement | null>;
  photoRef: RefObject<HTMLDivElement | null>;
  surfaceRef: RefObject<SVGSVGElement | null>;
  wetRef: RefObject<HTMLCanvasElement | null>;
  size: { width: number; height: number };
  zoom: number;
  isDrawing: boolean;
  events: ComponentProps<'svg'>;
  children: ReactNode;
}

/** The photo, whole in sight until it is brought nearer; over it what is drawn, and over that the wet ink. */
export function PhotoSurface(props: Props) {
  const { photo, scrollerRef, photoRef, surfaceRef, wetRef, size, zoom, isDrawing, events, children } = props;
  const { widthPx, heightPx, alt } = photo;
  const width = `calc(min(100%, 78dvh * ${widthPx / heightPx}) * ${zoom})`;
  return (
    <div className="relative min-w-0 bg-weave">
      <div ref={scrollerRef} className="max-h-[78dvh] overflow-auto overscroll-contain">
        <div
          ref={photoRef}
          className="relative mx-auto"
          style={{ width, aspectRatio: `${widthPx} / ${heightPx}` }}
        >
          <img
            src={photo.src}
            srcSet={photo.srcSet}
            sizes={`(min-width: 64rem) ${Math.round(50 * zoom)}vw, ${Math.round(100 * zoom)}vw`}
            width={widthPx}
            height={heightPx}
            alt={alt}
            draggable={false}
            className="absolute inset-0 h-full w-full select-none"
          />
          <svg
            ref={surfaceRef}
            role="application"
            aria-label={`${alt}. Draw with the keys: press question mark to hear them.`}
            viewBox={`0 0 ${size.width} ${size.height}`}
            preserveAspectRatio="none"
            className={join(
              'absolute inset-0 h-full w-full select-none',
              isDrawing && 'cursor-crosshair touch-none',
              PHOTO_INKS,
            )}
            {...events}
          >
            {children}
          </svg>
        </div>
      </div>
      <canvas ref={wetRef} aria-hidden className="pointer-events-none absolute inset-0 h-full w-full" />
    </div>
  );
}
