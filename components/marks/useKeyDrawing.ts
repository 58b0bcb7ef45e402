'use client';
import { type KeyboardEvent, useState } from 'react';
import { MARK_KINDS, type PhotoPoint, photoPoint } from './model/mark';
import { placeWords } from './model/place-words';
import type { Tool } from './tool';

interface Options {
  tool: Tool;
  /** The photo's size on the screen, in pixels: a step of a key is one of them. */
  size: { width: number; height: number };
  hasSelected: boolean;
  onTool: (tool: Tool) => void;
  /** Sets a point there, or chooses what lies there when nothing is being drawn. */
  onSet: (at: PhotoPoint) => void;
  /** Moves the chosen mark, by fractions of the photo. */
  onNudge: (dx: number, dy: number) => void;
  onDelete: () => void;
  onLetGo: () => void;
  onUndo: () => void;
  onRedo: () => void;
  /** Nearer above 1, farther below; 0 is the whole photo. */
  onZoom: (factor: number) => void;
  onHelp: () => void;
  say: (words: string) => void;
}

const ARROWS: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};
const COARSE = 10;
const ZOOMS: Record<string, number> = { '+': 1.5, '=': 1.5, '-': 1 / 1.5, '0': 0 };

/** The keys of the photo: arrows move a cross, Enter sets points with it, twice in one place ends the line. */
export function useKeyDrawing(options: Options) {
  const { tool, size, hasSelected } = options;
  const [cross, setCross] = useState<PhotoPoint | null>(null);

  const arrow = ([x, y]: [number, number], isCoarse: boolean) => {
    const by = isCoarse ? COARSE : 1;
    const [dx, dy] = [(x * by) / size.width, (y * by) / size.height];
    if (tool === 'look' && hasSelected) return options.onNudge(dx, dy);
    const now = cross ? photoPoint(cross.x + dx, cross.y + dy) : photoPoint(0.5, 0.5);
    setCross(now);
    options.say(`Cross at the ${placeWords(now)}`);
  };
  const leave = () => {
    setCross(null);
    options.onLetGo();
  };

  const withCtrl = (event: KeyboardEvent): boolean => {
    const key = event.key.toLowerCase();
    if (key === 'y') return (options.onRedo(), true);
    if (key !== 'z') return false;
    return ((event.shiftKey ? options.onRedo : options.onUndo)(), true);
  };
  const act = (event: KeyboardEvent): boolean => {
    if (event.ctrlKey || event.metaKey) return withCtrl(event);
    if (event.altKey) return false;
    const [direction, zoom] = [ARROWS[event.key], ZOOMS[event.key]];
    if (direction) return (arrow(direction, event.shiftKey), true);
    if (zoom !== undefined) return (options.onZoom(zoom), true);
    const kind = MARK_KINDS[Number(event.key) - 1];
    if (kind) return (options.onTool(kind), true);
    if (event.key === '7') return (options.onTool('look'), true);
    if (event.key === 'Enter' && cross) return (options.onSet(cross), true);
    if (event.key === 'Escape') return (leave(), true);
    if (event.key === '?') return (options.onHelp(), true);
    if ((event.key === 'Delete' || event.key === 'Backspace') && hasSelected) return (options.onDelete(), true); // prettier-ignore
    return false;
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (act(event)) event.preventDefault();
  };
  return { cross, onKeyDown };
}
