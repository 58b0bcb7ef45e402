'use client';
import { useCallback, useEffect, useState } from 'react';

const UNTOUCHED_MS = 60_000;

/** Hides the photos at once, after a minute without a touch, and when the page goes out of sight. Marks are kept. */
export function useCover() {
  const [isCovered, setCovered] = useState(false);
  const cover = useCallback(() => setCovered(true), []);
  const uncover = useCallback(() => setCovered(false), []);
  useEffect(() => {
    if (isCovered) return;
    let timer = setTimeout(cover, UNTOUCHED_MS);
    const touched = () => {
      clearTimeout(timer);
      timer = setTimeout(cover, UNTOUCHED_MS);
    };
    const hidden = () => document.visibilityState === 'hidden' && cover();
    const touches = ['pointerdown', 'pointermove', 'keydown', 'scroll'] as const;
    for (const name of touches) window.addEventListener(name, touched, { passive: true });
    document.addEventListener('visibilitychange', hidden);
    return () => {
      clearTimeout(timer);
      for (const name of touches) window.removeEventListener(name, touched);
      document.removeEventListener('visibilitychange', hidden);
    };
  }, [isCovered, cover]);
  return { isCovered, cover, uncover };
}
