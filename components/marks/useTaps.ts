'use client';
import { useState } from 'react';
import type { PhotoPoint } from './model/mark';
import { placeWords } from './model/place-words';
import { tapAt } from './model/taps';
import type { Tool } from './tool';

interface Options {
  tool: Tool;
  /** The photo's size on the screen, in pixels. */
  size: { width: number; height: number };
  onLine: (points: PhotoPoint[]) => void;
  say: (words: string) => void;
}

/** A line made of single points, by taps or by keys. Nothing is held down, nothing is dragged. */
export function useTaps({ tool, size, onLine, say }: Options) {
  const [points, setPoints] = useState<PhotoPoint[]>([]);
  const forget = () => setPoints([]);
  const end = () => {
    if (points.length > 1) onLine(points);
    forget();
  };
  const set = (at: PhotoPoint, againPx: number) => {
    if (tool === 'look') return;
    const now = tapAt(points, at, tool, size, againPx);
    if (now.isDone) {
      forget();
      return onLine(now.points);
    }
    setPoints(now.points);
    if (now.points.length > points.length) say(`Point ${now.points.length}, ${placeWords(at)} of the photo`);
  };
  const takeBack = () => {
    setPoints(points.slice(0, -1));
    say(points.length > 1 ? `${points.length - 1} set` : 'Nothing set');
  };
  return { points, set, end, takeBack, forget };
}
