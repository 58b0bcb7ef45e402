'use client';
import { useEffect, useRef, useState } from 'react';
import { photoUrl } from '@/components/photos/PhotoImage';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Notice } from '@/components/ui/Notice';
import { Tick } from '@/components/ui/Tick';
import type { PhotoDto } from '@/db/queries/photos';
import { closeCamera, type Facing, openCamera } from './open-camera';
import { ShotChooser } from './ShotChooser';
import type { Shot } from './take-frame';
import { useBurst } from './useBurst';
import { useLevel } from './useLevel';

interface Props {
  /** The photo of this view of the round before, to stand where one stood then. */
  ghost: Pick<PhotoDto, 'id' | 'revision'> | null;
  onTake: (file: File) => void;
  onClose: () => void;
}

const TIMERS = [
  { value: '0', label: 'At once' },
  { value: '5', label: '5 seconds' },
  { value: '10', label: '10 seconds' },
] as const;
const FACINGS = [
  { value: 'environment', label: 'Back of the phone' },
  { value: 'user', label: 'Front of the phone' },
] as const;

/** The camera in the page: what it takes goes into the round and into no gallery. */
export function CameraPanel({ ghost, onTake, onClose }: Props) {
  const [facing, setFacing] = useState<Facing>('environment');
  const [seconds, setSeconds] = useState<'0' | '5' | '10'>('10');
  const [hasGhost, setHasGhost] = useState(true);
  const [shots, setShots] = useState<Shot[]>([]);
  const { video, sentence } = useCamera(facing);
  const burst = useBurst(video, setShots);
  const rollDeg = useLevel();
  const letGo = () => {
    shots.forEach(({ url }) => URL.revokeObjectURL(url));
    setShots([]);
  };
  const close = () => {
    burst.stop();
    letGo();
    onClose();
  };
  const use = ({ file }: Shot) => {
    onTake(file);
    letGo();
  };
  if (sentence)
    return (
      <div className="grid justify-items-start gap-3">
        <Notice tone="care" role="alert">
          {sentence}
        </Notice>
        <Button onClick={onClose}>Close the camera</Button>
      </div>
    );
  return (
    <section aria-label="Camera" className="grid gap-3">
      <div className="relative mx-auto w-full max-w-md overflow-hidden bg-ink">
        <video ref={video} autoPlay muted playsInline aria-label="What the camera sees" className="block w-full" />
        {hasGhost && ghost ? (
          <img
            src={photoUrl(ghost.id, ghost.revision, '640')}
            alt=""
            className="pointer-events-none absolute inset-0 h-full w-full object-contain opacity-35"
          />
        ) : null}
        <Plumb />
        {burst.left === null ? null : (
          <p role="status" className="absolute inset-x-0 bottom-4 text-center text-5xl font-bold text-[#fffdf6] [text-shadow:0_0_6px_#10151c]">
            {burst.left === 0 ? 'Stand still' : burst.left}
          </p>
        )}
      </div>
      {rollDeg === null ? null : (
        <p role="status">{Math.abs(rollDeg) <= 1 ? 'The phone is level.' : `The phone leans ${Math.abs(rollDeg)}° to the ${rollDeg > 0 ? 'right' : 'left'}.`}</p>
      )}
      {shots.length > 0 ? (
        <ShotChooser shots={shots} onUse={use} onAgain={letGo} />
      ) : (
        <>
          <Choice legend="Which camera" options={FACINGS} value={facing} onChange={setFacing} />
          <Choice legend="Wait before it takes three" options={TIMERS} value={seconds} onChange={setSeconds} />
          {ghost ? <Tick label="Show where you stood in the round before" checked={hasGhost} onChange={(event) => setHasGhost(event.target.checked)} /> : null}
          <div className="flex flex-wrap gap-3">
            {burst.left === null ? (
              <Button look="chalk" onClick={() => void burst.start(Number(seconds))}>
                Take three
              </Button>
            ) : (
              <Button onClick={burst.stop}>Stop</Button>
            )}
            <Button onClick={close}>Close the camera</Button>
          </div>
        </>
      )}
    </section>
  ); // prettier-ignore
}

/** A plumb line to stand on, and a level at hip height, in two tones. */
function Plumb() {
  const lines = [
    { x1: 50, x2: 50, y1: 0, y2: 100 },
    { x1: 0, x2: 100, y1: 50, y2: 50 },
  ];
  return (
    <svg viewBox="0 0 100 100" preserveAspectRatio="none" aria-hidden className="pointer-events-none absolute inset-0 h-full w-full">
      {lines.flatMap((line, i) => [
        <line key={`${i} dark`} {...line} stroke="#10151c" strokeWidth={3} vectorEffect="non-scaling-stroke" opacity={0.6} />,
        <line key={`${i} light`} {...line} stroke="#fffdf6" strokeWidth={1} vectorEffect="non-scaling-stroke" />,
      ])}
    </svg>
  ); // prettier-ignore
}

/** The camera's picture in a video element for as long as it is shown; a sentence where it cannot be had. */
function useCamera(facing: Facing) {
  const video = useRef<HTMLVideoElement | null>(null);
  const [sentence, setSentence] = useState('');
  useEffect(() => {
    let isGone = false;
    let held: MediaStream | null = null;
    void openCamera(facing).then((opened) => {
      if (!opened.ok) return isGone ? undefined : setSentence(opened.sentence);
      if (isGone) return closeCamera(opened.stream);
      held = opened.stream;
      if (video.current) video.current.srcObject = opened.stream;
    });
    return () => {
      isGone = true;
      if (held) closeCamera(held);
    };
  }, [facing]);
  return { video, sentence };
}
