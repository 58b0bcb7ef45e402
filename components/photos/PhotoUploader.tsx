'use client';
import { Aperture, Camera, ImagePlus } from 'lucide-react';
import { type ChangeEvent, lazy, Suspense, useEffect, useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Disclosure } from '@/components/ui/Disclosure';
import { buttonClass } from '@/components/ui/styles';
import type { PhotoDto } from '@/db/queries/photos';
import type { View } from '@/diagnosis/garments/schema';
import { readyToPrepare } from './prepare-photo';
import { UploadLines } from './UploadLines';
import { useUploads } from './useUploads';
import { TAKEN_OPTIONS, VIEW_OPTIONS } from './view-words';

// Fetched on first use.
const PageCamera = lazy(() => import('@/components/camera/Camera').then(({ Camera: it }) => ({ default: it }))); // prettier-ignore

interface Props {
  userId: string;
  roundId: string;
  /** The view that is on the table, taken as what comes next. */
  view: View;
  /** Where photos are there already, the questions wait behind a line. */
  isFolded: boolean;
  /** The round before, whose photos show where one stood. */
  previousRoundId?: string | null;
  onAdded: (photo: PhotoDto) => void;
}

/** Photos into a round, one or several: what they show and whether a mirror was between is asked, the rest goes by itself. */
export function PhotoUploader({ userId, roundId, view, isFolded, previousRoundId = null, onAdded }: Props) {
  const [chosenView, setChosenView] = useState<View | null>(null);
  const [taken, setTaken] = useState<'camera' | 'mirror'>('camera');
  const [isCamera, setCamera] = useState(false);
  const { lines, add, cancel } = useUploads({ userId, roundId, onAdded });
  useEffect(() => void readyToPrepare(), []);
  const shown = chosenView ?? view;
  const take = (event: ChangeEvent<HTMLInputElement>) => {
    const files = [...(event.target.files ?? [])];
    event.target.value = '';
    if (files.length > 0) void add(files, shown, taken === 'mirror');
  };
  const pick = (label: string, Icon: typeof Camera, isPhones: boolean) => (
    <label
      className={buttonClass(
        'plain',
        'relative has-focus-visible:outline-3 has-focus-visible:outline-offset-3 has-focus-visible:outline-chalk',
      )}
    >
      <Icon aria-hidden size={20} />
      {label}
      <input
        type="file"
        // Without HEIC in this list a phone that takes it hands over a JPEG.
        accept="image/jpeg,image/png,image/webp"
        multiple={!isPhones}
        capture={isPhones ? 'environment' : undefined}
        onChange={take}
        className="absolute inset-0 opacity-0"
      />
    </label>
  );
  const questions = (
    <div className="grid gap-4">
      <Choice legend="What it shows" options={VIEW_OPTIONS} value={shown} onChange={setChosenView} />
      <Choice legend="Taken" options={TAKEN_OPTIONS} value={taken} onChange={setTaken} />
      <div className="flex flex-wrap gap-3">
        <Button onClick={() => setCamera(true)} disabled={isCamera}>
          <Aperture aria-hidden size={20} />
          Camera in this page
        </Button>
        {pick('Take a photo', Camera, true)}
        {pick('Add photos', ImagePlus, false)}
      </div>
      {isCamera ? (
        <Suspense fallback={null}>
          <PageCamera
            view={shown}
            previousRoundId={previousRoundId}
            onTake={(file) => void add([file], shown, taken === 'mirror')}
            onClose={() => setCamera(false)}
          />
        </Suspense>
      ) : null}
      <HowToTake />
    </div>
  );
  return (
    <div className="grid gap-4">
      {isFolded ? <Disclosure summary="Add photos">{questions}</Disclosure> : questions}
      <UploadLines lines={lines} onCancel={(key) => void cancel(key)} />
    </div>
  );
}

function HowToTake() {
  return (
    <Disclosure summary="How to take one that can be read">
      <ul className="list-disc pl-5">
        <li>Phone at hip height, at least two and a half metres away, level.</li>
        <li>Lamp from the side, no flash. Plain wall, plain mid-tone cloth.</li>
        <li>Usual heel, eyes ahead, feet a hand apart, arms a little away. One photo after five steps.</li>
        <li>
          The phone’s own camera keeps its picture in the gallery, and perhaps in its cloud; the camera in
          this page does not.
        </li>
      </ul>
    </Disclosure>
  );
}
