'use client';
import { Keyboard, MousePointer2, Redo2, Undo2, ZoomIn, ZoomOut } from 'lucide-react';
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
  'flex min-h-12 min-w-11 flex-col items-center justify-center rounded-md leading-tight data-[state=on]:bg-ink data-[state=on]:text-cloth lg:col-span-2';

/** What the hand holds: the six marks or the eye, how strong; the way back, and the glass. Under the thumb on a phone, beside the photo on a desk. */
export function MarkToolbar(props: Props) {
  const { tool, onTool, severity, onSeverity } = props;
  return (
    <div className="grid grid-cols-5 gap-0.5 bg-cloth py-1 lg:w-22 lg:grid-cols-2 lg:content-start">
      <ToggleGroup.Root
        type="single"
        value={tool}
        onValueChange={(value) => value && onTool(value as Tool)}
        aria-label="Draw"
        className="contents"
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
      <IconButton label="Undo" isOff={!props.canUndo} onClick={props.onUndo}>
        <Undo2 aria-hidden size={22} />
      </IconButton>
      <IconButton label="Redo" isOff={!props.canRedo} onClick={props.onRedo}>
        <Redo2 aria-hidden size={22} />
      </IconButton>
      <IconButton label="Keys of the photo" onClick={props.onHelp}>
        <Keyboard aria-hidden size={22} />
      </IconButton>
      <StrengthPicker severity={severity} onSeverity={onSeverity} />
      <IconButton label="Nearer" onClick={() => props.onZoom(STEP)}>
        <ZoomIn aria-hidden size={22} />
      </IconButton>
      <IconButton label="Farther" onClick={() => props.onZoom(1 / STEP)}>
        <ZoomOut aria-hidden size={22} />
      </IconButton>
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
      className="inline-flex min-h-11 min-w-11 items-center justify-center rounded-md disabled:opacity-40"
    >
      {props.children}
    </button>
  );
}
