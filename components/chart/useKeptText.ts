'use client';
import { useEffect, useState } from 'react';

/** A text that outlives a reload of this tab until it was kept: what someone pasted is never lost. */
export function useKeptText(key: string, kept: string) {
  const [value, setValue] = useState(kept);
  useEffect(() => {
    // Read after the first paint: the server has no tab, and both must draw the same at first.
    const left = sessionStorage.getItem(key);
    if (left === null) return;
    const frame = requestAnimationFrame(() => setValue(left));
    return () => cancelAnimationFrame(frame);
  }, [key]);
  return {
    value,
    set: (text: string) => {
      setValue(text);
      try {
        sessionStorage.setItem(key, text);
      } catch {
        // A full or closed store: the text is still in the field.
        sessionStorage.removeItem(key);
      }
    },
    forget: () => sessionStorage.removeItem(key),
  };
}
