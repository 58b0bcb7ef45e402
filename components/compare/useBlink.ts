'use client';
import { useEffect, useState, useSyncExternalStore } from 'react';

/** Half a second each: one change in either direction, twice in a second at the most. */
const HALF_MS = 500;
const STILL = '(prefers-reduced-motion: reduce)';

const watchStill = (told: () => void) => {
  const query = window.matchMedia(STILL);
  query.addEventListener('change', told);
  return () => query.removeEventListener('change', told);
};

/** Which of two pictures is in sight. It changes by itself only while it may: never for those who asked for less motion. */
export function useBlink(isOn: boolean) {
  const isStill = useSyncExternalStore(
    watchStill,
    () => window.matchMedia(STILL).matches,
    () => true,
  );
  const [isSecond, setSecond] = useState(false);
  const [isHeld, setHeld] = useState(false);
  const isRunning = isOn && !isStill && !isHeld;
  useEffect(() => {
    if (!isRunning) return;
    const timer = setInterval(() => setSecond((now) => !now), HALF_MS);
    return () => clearInterval(timer);
  }, [isRunning]);
  const flip = () => {
    setHeld(true);
    setSecond((now) => !now);
  };
  return {
    isSecond,
    isRunning,
    canRun: !isStill,
    flip,
    run: () => setHeld(false),
    hold: () => setHeld(true),
  };
}
