'use client';
import { MousePointer2, Redo2, Undo2, ZoomIn, ZoomOut } from 'lucide-react';
import { ToggleGroup } from 'radix-ui';
import type { ReactNode } from 'react';
import { KindIcon } from './KindIcon';
import { MARK_KINDS, type MarkSeverity } from './model/mark';
import { KIND_WORDS } from './model/mark-text';
import { StrengthPicker } from './StrengthPicker';
import type { Tool } from './tool';
import { STEP } from './useViewport';

interface Props {
  tool: Tool;
  onTool: (tool: Tool) => void;
  /** Of the chosen mark, or of the next one. */
  severity: MarkSeverity;
  onSeverity: (severity: MarkSeverity) => void;
  canUndo: boolean;
  canRedo: boolean;
  onUndo: () => void;
  onRedo: () => void;
  onZoom: (by: number) => void;
  onHelp: () => void;
}

const CELL =
  'flex min-h-12 min-w-11 flex-1 flex-col items-center justify-center rounded-md px-0.5 leading-tight data-[state=on]:bg-ink data-[state=on]:text-cloth lg:flex-none lg:min-w-16';

/** What the hand holds: the six marks or the eye, how strong; the way back, and the glass. Under the thumb on a phone, beside the photo on a desk. */
export function MarkToolbar(props: Props) {
  const { tool, onTool, severity, onSeverity } = props;
  return (
    <div className="grid gap-1 bg-cloth py-1 lg:content-start lg:gap-3">
      <ToggleGroup.Root
        type="single"
        value={tool}
        onValueChange={(value) => value && onTool(value as Tool)}
        aria-label="Draw"
        className="flex gap-0.5 lg:flex-col"
      >
        <ToggleGroup.Item value="look" className={CELL} aria-label="Look and choose">
          <MousePointer2 aria-hidden size={24} />
          <span className="text-sm">Look</span>
        </ToggleGroup.Item>
        {MARK_KINDS.map((kind) => (
          <ToggleGroup.Item key={kind} value={kind} className={CELL} aria-label={KIND_WORDS[kind]}>
            <KindIcon kind={kind} />
            <span className="text-sm">{KIND_WORDS[kind].split(' ')[0]}</span>
          </ToggleGroup.Item>
        ))}
      </ToggleGroup.Root>
      <div className="flex items-center justify-between gap-1 lg:flex-col">
        <StrengthPicker severity={severity} onSeverity={onSeverity} />
        <div className="flex lg:grid lg:grid-cols-2">
          <IconButton label="Undo" isOff={!props.canUndo} onClick={props.onUndo}>
            <Undo2 aria-hidden size={22} />
          </IconButton>
          <IconButton label="Redo" isOff={!props.canRedo} onClick={props.onRedo}>
            <Redo2 aria-hidden size={22} />
          </IconButton>
          <IconButton label="Nearer" onClick={() => props.onZoom(STEP)}>
            <ZoomIn aria-hidden size={22} />
          </IconButton>
          <IconButton label="Farther" onClick={() => props.onZoom(1 / STEP)}>
            <ZoomOut aria-hidden size={22} />
          </IconButton>
        </div>
        <button
          type="button"
          onClick={props.onHelp}
          className="hidden min-h-11 text-sm text-chalk underline underline-offset-4 lg:inline-block"
        >
          Keys
        </button>
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
      className="inline-flex size-11 items-center justify-center rounded-md disabled:opacity-40"
    >
      {props.children}
    </button>
  );
}
