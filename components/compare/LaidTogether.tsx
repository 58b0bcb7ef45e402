'use client';
import { Maximize, ZoomIn, ZoomOut } from 'lucide-react';
import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Tick } from '@/components/ui/Tick';
import type { MarkedPhotoDto } from '@/db/queries/marked-photos';
import { OneOverOther, type OverWay } from './OneOverOther';
import { PhotoFrame } from './PhotoFrame';
import { PhotoLayer } from './PhotoLayer';
import { RoundCaption } from './RoundCaption';
import { overMap } from './shown-photo';
import { useLinkedView } from './useLinkedView';

export interface RoundPhoto {
  number: number;
  photo: MarkedPhotoDto;
}

type Way = 'beside' | OverWay;
const WAYS: readonly { value: Way; label: string }[] = [
  { value: 'beside', label: 'Next to each other' },
  { value: 'swipe', label: 'Swipe' },
  { value: 'overlay', label: 'Over one another' },
  { value: 'blink', label: 'Blink' },
];

const NOT_PLACED =
  'Place the figure on this view in both rounds, and the photos are laid over one another by waist and fork. Until then they stand as they were taken.';

/** One view of two rounds. The later photo is turned and sized until its figure lies on that of the earlier. */
export function LaidTogether({ before, after }: { before: RoundPhoto; after: RoundPhoto }) {
  const [way, setWay] = useState<Way>('beside');
  const [hasMarksOf, setMarksOf] = useState({ before: true, after: true });
  const linked = useLinkedView();
  const map = overMap(after.photo, before.photo);
  const height = before.photo.heightPx / before.photo.widthPx;
  const ownHeight = map ? height : after.photo.heightPx / after.photo.widthPx;
  const frame = { view: linked.view, events: linked.events };
  const marks = (isPicture: 'before' | 'after') => ({
    before: { hasMarks: hasMarksOf.before, hasPicture: isPicture === 'before' },
    after: { hasMarks: hasMarksOf.after, hasPicture: isPicture === 'after' },
  });
  const isOver = way !== 'beside' && map !== null;
  return (
    <div className="grid gap-3">
      {map ? (
        <Choice legend="How to look" hidesLegend options={WAYS} value={way} onChange={setWay} />
      ) : (
        <p className="max-w-prose text-graphite">{NOT_PLACED}</p>
      )}
      {isOver ? (
        <OneOverOther way={way} before={before} after={after} map={map} hasMarksOf={hasMarksOf} height={height} {...frame} />
      ) : (
        <div className="grid grid-cols-2 gap-2 md:gap-6">
          <figure className="grid content-start gap-2">
            <PhotoFrame label={`Round ${before.number}`} height={height} {...frame}>
              <PhotoLayer photo={before.photo} {...marks('before').before} />
              {map ? <PhotoLayer photo={after.photo} map={map} {...marks('before').after} /> : null}
            </PhotoFrame>
            <RoundCaption {...before} />
          </figure>
          <figure className="grid content-start gap-2">
            <PhotoFrame label={`Round ${after.number}`} height={ownHeight} {...frame}>
              <PhotoLayer photo={after.photo} map={map} {...marks('after').after} />
              {map ? <PhotoLayer photo={before.photo} {...marks('after').before} /> : null}
            </PhotoFrame>
            <RoundCaption {...after} />
          </figure>
        </div>
      )}
      <div className="no-print flex flex-wrap items-center gap-x-6 gap-y-2">
        <Button aria-label="Nearer" onClick={() => linked.zoomBy(linked.nearer)}>
          <ZoomIn aria-hidden size={20} />
        </Button>
        <Button aria-label="Farther" onClick={() => linked.zoomBy(1 / linked.nearer)}>
          <ZoomOut aria-hidden size={20} />
        </Button>
        <Button aria-label="The whole photo" onClick={linked.whole}>
          <Maximize aria-hidden size={20} />
        </Button>
        <Tick
          label={`Marks of round ${before.number}`}
          checked={hasMarksOf.before}
          onChange={(event) => setMarksOf((now) => ({ ...now, before: event.target.checked }))}
        />
        <Tick
          label={`Marks of round ${after.number}`}
          checked={hasMarksOf.after}
          onChange={(event) => setMarksOf((now) => ({ ...now, after: event.target.checked }))}
        />
      </div>
    </div>
  ); // prettier-ignore
}
