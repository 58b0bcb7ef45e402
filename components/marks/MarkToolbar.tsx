'use client';
import { Eye, Redo2, Undo2, ZoomIn, ZoomOut } from 'lucide-react';
import { ToggleGroup } from 'radix-ui';
import type { ReactNode } from 'react';
import { markStrokes } from './shapes';
import { MARK_KINDS, type MarkKind } from './model/mark';
import { KIND_WORDS } from './model/mark-text';
import type { Tool } from './useDrawing';

interface Props {
  tool: Tool;
  onTool: (tool: Tool) => void;
  canUndo: boolean;
  canRedo: boolean;
  onUndo: () => void;
  onRedo: () => void;
  onZoom: (by: number) => void;
}

const ICON_POINTS: Record<MarkKind, { x: number; y: number }[]> = {
  tight: [{ x: 6, y: 22 }, { x: 24, y: 8 }],
  slack: [{ x: 5, y: 20 }, { x: 25, y: 10 }],
  gap: [{ x: 6, y: 9 }, { x: 24, y: 9 }],
  pooling: [{ x: 5, y: 15 }, { x: 25, y: 15 }],
  tilt: [{ x: 5, y: 18 }, { x: 25, y: 12 }],
  pin: [{ x: 10, y: 10 }],
}; // prettier-ignore

function KindIcon({ kind }: { kind: MarkKind }) {
  return (
    <svg viewBox="0 0 30 30" width="30" height="30" aria-hidden fill="none" stroke="currentColor">
      {markStrokes(kind, ICON_POINTS[kind], 1, 0.55).map(({ d, dash }, i) => (
        <path
          key={i}
          d={d}
          strokeWidth="2.2"
          strokeDasharray={dash}
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      ))}
    </svg>
  );
}

const CELL =
  'flex min-h-12 min-w-14 flex-col items-center justify-center rounded-md px-1 leading-tight data-[state=on]:bg-ink data-[state=on]:text-cloth';

/** What the hand holds: the eye, or one of the six marks; beside it the way back and the glass. */
export function MarkToolbar({ tool, onTool, canUndo, canRedo, onUndo, onRedo, onZoom }: Props) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
      <ToggleGroup.Root
        type="single"
        value={tool}
        onValueChange={(value) => value && onTool(value as Tool)}
        aria-label="Draw"
        className="flex flex-wrap gap-1"
      >
        <ToggleGroup.Item value="look" className={CELL} aria-label="Look and choose">
          <Eye aria-hidden size={24} />
          <span className="text-sm">Look</span>
        </ToggleGroup.Item>
        {MARK_KINDS.map((kind) => (
          <ToggleGroup.Item key={kind} value={kind} className={CELL} aria-label={KIND_WORDS[kind]}>
            <KindIcon kind={kind} />
            <span className="text-sm">{KIND_WORDS[kind].split(' ')[0]}</span>
          </ToggleGroup.Item>
        ))}
      </ToggleGroup.Root>
      <div className="flex gap-1">
        <IconButton label="Undo" isOff={!canUndo} onClick={onUndo}>
          <Undo2 aria-hidden size={22} />
        </IconButton>
        <IconButton label="Redo" isOff={!canRedo} onClick={onRedo}>
          <Redo2 aria-hidden size={22} />
        </IconButton>
        <IconButton label="Nearer" onClick={() => onZoom(1.5)}>
          <ZoomIn aria-hidden size={22} />
        </IconButton>
        <IconButton label="Farther" onClick={() => onZoom(1 / 1.5)}>
          <ZoomOut aria-hidden size={22} />
        </IconButton>
      </div>
    </div>
  );
}

function IconButton(props: { label: string; isOff?: boolean; onClick: () => void; children: ReactNode }) {
  return (
    <button
      type="button"
      aria-label={props.label}
      disabled={props.isOff}
      onClick={props.onClick}
      className="inline-flex size-12 items-center justify-center rounded-md disabled:opacity-40"
    >
      {props.children}
    </button>
  );
}
