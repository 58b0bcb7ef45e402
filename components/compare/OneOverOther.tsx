'use client';
import { type ComponentProps, useId, useState } from 'react';
import { Button } from '@/components/ui/Button';
import type { Affine } from '@/diagnosis/photo/lay-over';
import type { RoundPhoto } from './LaidTogether';
import { PhotoFrame } from './PhotoFrame';
import { PhotoLayer } from './PhotoLayer';
import { useBlink } from './useBlink';
import type { LinkedView } from './useLinkedView';

export type OverWay = 'swipe' | 'overlay' | 'blink';

interface Props {
  way: OverWay;
  before: RoundPhoto;
  after: RoundPhoto;
  map: Affine;
  hasMarksOf: { before: boolean; after: boolean };
  height: number;
  view: LinkedView;
  events: ComponentProps<'svg'>;
}

/** The later photo over the earlier: behind an edge that is drawn aside, thinned, or in turn. */
export function OneOverOther({ way, before, after, map, hasMarksOf, height, view, events }: Props) {
  const [percent, setPercent] = useState(50);
  const blink = useBlink(way === 'blink');
  const clip = useId();
  const left = view.x - 0.5 / view.zoom;
  const edge = left + percent / 100 / view.zoom;
  const isUpper = way !== 'blink' || blink.isSecond;
  const upper =
    way === 'swipe' ? { clipPath: `url(#${clip})` } : way === 'overlay' ? { opacity: percent / 100 } : {};
  return (
    <div className="mx-auto grid w-full max-w-xl gap-3">
      <PhotoFrame label={`Round ${after.number} over round ${before.number}`} height={height} view={view} events={events}>
        <clipPath id={clip}>
          <rect x={-1} y={-height} width={1 + edge} height={3 * height} />
        </clipPath>
        <PhotoLayer photo={before.photo} hasMarks={hasMarksOf.before && (way !== 'blink' || !blink.isSecond)} />
        {isUpper ? <PhotoLayer photo={after.photo} map={map} hasMarks={hasMarksOf.after} {...upper} /> : null}
        {way === 'swipe' ? <line x1={edge} x2={edge} y1={0} y2={height} stroke="#fffdf6" strokeWidth={3} vectorEffect="non-scaling-stroke" /> : null}
      </PhotoFrame>
      {way === 'blink' ? (
        <div className="flex flex-wrap items-center gap-3">
          <Button onClick={blink.flip}>Show the other</Button>
          {blink.canRun ? (
            <Button onClick={blink.isRunning ? blink.hold : blink.run}>{blink.isRunning ? 'Hold' : 'Go on'}</Button>
          ) : null}
          <p aria-live={blink.isRunning ? 'off' : 'polite'}>Round {blink.isSecond ? after.number : before.number}</p>
        </div>
      ) : (
        <label className="grid gap-1">
          <span className="font-bold">How much of round {after.number}</span>
          <input
            type="range"
            min={0}
            max={100}
            value={percent}
            onChange={(event) => setPercent(Number(event.target.value))}
            className="min-h-11 w-full accent-chalk"
          />
        </label>
      )}
    </div>
  ); // prettier-ignore
}
