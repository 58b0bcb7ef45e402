'use client';
import { type MouseEvent, useRef, useState } from 'react';
import { v7 } from 'uuid';
import { OthersMarks } from '@/components/conversation/OthersMarks';
import type { OthersMark } from '@/components/conversation/useConversation';
import { DrawingAids } from './DrawingAids';
import { KeyHelp } from './KeyHelp';
import { MarkBar } from './MarkBar';
import { MarkHandles } from './MarkHandles';
import { MarkLayer } from './MarkLayer';
import { MarkToolbar } from './MarkToolbar';
import { MARKS_MAX } from './mark-limits-schema';
import { markAt } from './model/hit-test';
import { addMark, editMark, type MarkHistory, redo, removeMark, undo } from './model/history';
import { type Mark, type MarkSeverity, moveMark, newMark, type PhotoPoint } from './model/mark';
import { markText } from './model/mark-text';
import { KEY_AGAIN_PX, TAP_AGAIN_PX } from './model/taps';
import { type CanvasPhoto, PhotoSurface } from './PhotoSurface';
import { TapBar } from './TapBar';
import type { Tool } from './tool';
import { pointOf, useDrawing } from './useDrawing';
import { useKeyDrawing } from './useKeyDrawing';
import { useTaps } from './useTaps';
import { useViewport } from './useViewport';

interface Props {
  photo: CanvasPhoto;
  history: MarkHistory;
  act: (step: (history: MarkHistory) => MarkHistory) => void;
  selected: string | null;
  onSelect: (id: string | null) => void;
  isReadOnly: boolean;
  /** Drawn beneath the marks that can be moved. */
  others?: readonly OthersMark[];
}

const NONE: readonly OthersMark[] = [];

/** A photo to draw on. Everything that drawing does, keys and the list beside it do too. */
export function MarkCanvas({ photo, history, act, selected, onSelect, isReadOnly, others = NONE }: Props) {
  const [tool, setTool] = useState<Tool>('look');
  const [nextSeverity, setNextSeverity] = useState<MarkSeverity>(2);
  const [isHelp, setHelp] = useState(false);
  const [said, say] = useState('');
  const surface = useRef<SVGSVGElement | null>(null);
  const wet = useRef<HTMLCanvasElement | null>(null);
  const {
    scroller,
    photo: photoRef,
    size,
    zoom,
    zoomBy,
    zoomOut,
  } = useViewport(photo.widthPx, photo.heightPx);
  const { marks } = history;
  const chosen = marks.find(({ id }) => id === selected) ?? null;
  const isLooking = tool === 'look';

  const edit = (change: (mark: Mark) => Mark, run?: string) =>
    chosen && act((now) => editMark(now, chosen.id, change, run));
  const draw = (points: PhotoPoint[]) => {
    if (tool === 'look') return;
    if (marks.length >= MARKS_MAX) return say(`A photo holds at most ${MARKS_MAX} marks.`);
    const mark = newMark(v7(), tool, nextSeverity, points);
    act((now) => addMark(now, mark));
    onSelect(mark.id);
    say(`Drawn: ${markText(mark)}`);
  };
  const taps = useTaps({ tool, size, onLine: draw, say });
  const chooseTool = (next: Tool) => {
    setTool(next);
    taps.forget();
    if (next !== 'look') onSelect(null);
  };
  const choose = (at: PhotoPoint) => {
    const found = markAt(marks, at, size);
    onSelect(found?.id ?? null);
    say(found ? `Chosen: ${markText(found)}` : 'No mark here');
  };
  const remove = () => {
    if (!chosen) return;
    act((now) => removeMark(now, chosen.id));
    onSelect(null);
    say(`Deleted: ${markText(chosen)}`);
  };
  const letGo = () => {
    taps.forget();
    onSelect(null);
  };
  const drawing = useDrawing({
    surface,
    wet,
    isOn: !isReadOnly && !isLooking,
    onLine: (points) => {
      taps.forget();
      draw(points);
    },
    onTap: (at) => taps.set(at, TAP_AGAIN_PX),
  });
  const keys = useKeyDrawing({
    tool,
    size,
    hasSelected: chosen !== null,
    onTool: chooseTool,
    onSet: (at) => (isLooking ? choose(at) : taps.set(at, KEY_AGAIN_PX)),
    onNudge: (dx, dy) => edit((mark) => moveMark(mark, dx, dy), 'nudge'),
    onDelete: remove,
    onLetGo: letGo,
    onUndo: () => act(undo),
    onRedo: () => act(redo),
    onZoom: (factor) => (factor === 0 ? zoomOut() : zoomBy(factor)),
    onHelp: () => setHelp(true),
    say,
  });
  const onClick = (event: MouseEvent<SVGSVGElement>) => {
    const at = isLooking && surface.current ? pointOf(surface.current, event) : null;
    if (at) choose(at);
  };
  const pixels = { widthPx: size.width, heightPx: size.height };

  return (
    <div className="grid gap-2 lg:grid-cols-[auto_minmax(0,1fr)] lg:gap-x-3">
      <div className="grid min-w-0 content-start gap-1 lg:col-start-2 lg:row-start-1">
        <PhotoSurface
          photo={photo}
          scrollerRef={scroller}
          photoRef={photoRef}
          surfaceRef={surface}
          wetRef={wet}
          size={size}
          zoom={zoom}
          isDrawing={!isLooking}
          events={isReadOnly ? {} : { tabIndex: 0, onClick, onKeyDown: keys.onKeyDown, ...drawing }}
        >
          <OthersMarks marks={others} {...pixels} />
          <MarkLayer marks={marks} exceptId={selected} {...pixels} />
          {chosen ? (
            <MarkHandles
              mark={chosen}
              surface={surface}
              isHeld={isLooking && !isReadOnly}
              onMoved={({ id, points }) => act((now) => editMark(now, id, (mark) => ({ ...mark, points })))}
              {...pixels}
            />
          ) : null}
          <DrawingAids points={taps.points} cross={keys.cross} {...pixels} />
        </PhotoSurface>
        <TapBar count={taps.points.length} onEnd={taps.end} onTakeBack={taps.takeBack} />
        {chosen && !isReadOnly && taps.points.length === 0 ? (
          <MarkBar mark={chosen} onEdit={edit} onDelete={remove} onLetGo={letGo} />
        ) : null}
      </div>
      {/* There from the start, so that the photo does not move when its marks have come. */}
      <div inert={isReadOnly}>
        <MarkToolbar
          tool={tool}
          onTool={chooseTool}
          severity={chosen?.severity ?? nextSeverity}
          onSeverity={(severity) => {
            setNextSeverity(severity);
            edit((mark) => ({ ...mark, severity }));
          }}
          canUndo={history.past.length > 0}
          canRedo={history.future.length > 0}
          onUndo={() => act(undo)}
          onRedo={() => act(redo)}
          onZoom={zoomBy}
          onHelp={() => setHelp(true)}
        />
      </div>
      <p role="status" className="sr-only">
        {said}
      </p>
      <KeyHelp isOpen={isHelp} onClose={() => setHelp(false)} onClosed={() => surface.current?.focus()} />
    </div>
  );
}
