import type { ComponentProps, ReactNode } from 'react';
import { PHOTO_INKS } from '@/components/marks/PhotoMark';
import { type LinkedView, viewBoxOf } from './useLinkedView';

interface Props {
  label: string;
  /** Height over width of the frame. */
  height: number;
  view: LinkedView;
  events: ComponentProps<'svg'>;
  children: ReactNode;
}

/** A window on photos laid over one another. In it the arrows move, + and − bring nearer, 0 shows the whole. */
export function PhotoFrame({ label, height, view, events, children }: Props) {
  return (
    <svg
      role="application"
      tabIndex={0}
      aria-label={`${label}. Arrows move, plus and minus bring nearer and farther, zero shows the whole.`}
      viewBox={viewBoxOf(view, height)}
      style={{ aspectRatio: `${1 / height}` }}
      className={`block w-full touch-pan-y overflow-hidden bg-weave ${view.zoom > 1 ? 'cursor-grab touch-none' : ''} ${PHOTO_INKS}`}
      {...events}
    >
      {children}
    </svg>
  );
}
