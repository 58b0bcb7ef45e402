'use client';
import { type KeyboardEvent, useState } from 'react';
import { type Mark, MARK_KINDS, moveMark, type PhotoPoint, photoPoint } from './model/mark';
import type { Tool } from './useDrawing';

interface Options {
  tool: Tool;
  selected: Mark | null;
  onTool: (tool: Tool) => void;
  onDrawn: (points: PhotoPoint[]) => void;
  onEdit: (id: string, edit: (mark: Mark) => Mark) => void;
  onDelete: (id: string) => void;
  onSelect: (id: string | null) => void;
  onUndo: () => void;
  onRedo: () => void;
  onHelp: () => void;
}

const ARROWS: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
const STEP = 0.02;
const FINE = 0.002;

/** The keys of the photo. Arrows move the cross, or the chosen mark; Enter sets an end; the second Enter makes the line. */
export function useKeyDrawing(options: Options) {
  const { tool, selected } = options;
  const [cross, setCross] = useState<PhotoPoint | null>(null);
  const [start, setStart] = useState<PhotoPoint | null>(null);

  const setEnd = () => {
    if (!cross || tool === 'look') return;
    if (tool === 'pin') return options.onDrawn([cross]);
    if (!start) return setStart(cross);
    setStart(null);
    options.onDrawn([start, cross]);
  };
  const leave = () => {
    setStart(null);
    setCross(null);
    options.onSelect(null);
  };
  const arrow = ([x, y]: [number, number], isFine: boolean) => {
    const by = isFine ? FINE : STEP;
    if (tool === 'look' && selected)
      return options.onEdit(selected.id, (mark) => moveMark(mark, x * by, y * by));
    setCross((now) => (now ? photoPoint(now.x + x * by, now.y + y * by) : photoPoint(0.5, 0.5)));
  };

  const onKeyDown = (event: KeyboardEvent) => {
    const act = (): boolean => {
      const direction = ARROWS[event.key];
      if (direction) return (arrow(direction, event.shiftKey), true);
      if ((event.ctrlKey || event.metaKey) && event.key.toLowerCase() === 'z')
        return ((event.shiftKey ? options.onRedo : options.onUndo)(), true);
      if (event.ctrlKey || event.metaKey || event.altKey) return false;
      const kind = MARK_KINDS[Number(event.key) - 1];
      if (kind) return (options.onTool(kind), true);
      if (event.key === '0') return (options.onTool('look'), true);
      if (event.key === 'Enter') return (setEnd(), true);
      if (event.key === 'Escape') return (leave(), true);
      if (event.key === '?') return (options.onHelp(), true);
      if ((event.key === 'Delete' || event.key === 'Backspace') && selected)
        return (options.onDelete(selected.id), true);
      return false;
    };
    if (act()) event.preventDefault();
  };
  return { cross, start, onKeyDown };
}
