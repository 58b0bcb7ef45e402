'use client';
import { type RefObject, useCallback, useEffect, useRef, useState } from 'react';
import { beep } from './beep';
import { type Shot, takeFrame } from './take-frame';

const BURST = 3;
const BETWEEN_MS = 600;
const wait = (ms: number) => new Promise<void>((done) => setTimeout(done, ms));

/** Counts down aloud, then takes three. Leaving the page, or stopping, takes none. */
export function useBurst(video: RefObject<HTMLVideoElement | null>, onTaken: (shots: Shot[]) => void) {
  const [left, setLeft] = useState<number | null>(null);
  const run = useRef(0);
  const stop = useCallback(() => {
    run.current += 1;
    setLeft(null);
  }, []);
  useEffect(
    () => () => {
      run.current += 1;
    },
    [],
  );
  const start = async (seconds: number) => {
    run.current += 1;
    const own = run.current;
    const sound = seconds > 0 && 'AudioContext' in window ? new AudioContext() : null;
    for (let now = seconds; now > 0 && own === run.current; now -= 1) {
      setLeft(now);
      if (sound) beep(sound, now === 1);
      await wait(1000);
    }
    const shots: Shot[] = [];
    for (let shot = 0; shot < BURST && own === run.current; shot += 1) {
      setLeft(0);
      const taken = video.current && (await takeFrame(video.current));
      if (taken) shots.push(taken);
      await wait(BETWEEN_MS);
    }
    void sound?.close();
    if (own !== run.current) return shots.forEach(({ url }) => URL.revokeObjectURL(url));
    setLeft(null);
    onTaken(shots);
  };
  return { left, start, stop };
}
