'use client';
import { useEffect, useRef, useState } from 'react';
import { v7 } from 'uuid';
import { KeyHelp } from './KeyHelp';
import { MarkHandles } from './MarkHandles';
import { MarkShape } from './MarkShape';
import { MarkToolbar } from './MarkToolbar';
import { addMark, editMark, type MarkHistory, redo, removeMark, undo } from './model/history';
import type { Mark, PhotoPoint } from './model/mark';
import { markText } from './model/mark-text';
import { newMark, type Tool, useDrawing } from './useDrawing';
import { useKeyDrawing } from './useKeyDrawing';

interface Props {
  photo: { src: string; srcSet: string; widthPx: number; heightPx: number; alt: string };
  history: MarkHistory;
  act: (step: (history: MarkHistory) => MarkHistory) => void;
  selected: string | null;
  onSelect: (id: string | null) => void;
  isReadOnly: boolean;
}

const ZOOM_MAX = 6;

/** Pixels of the master that one pixel of the screen takes, kept up to date as the surface changes its size. */
function useUnit(widthPx: number, zoom: number) {
  const surface = useRef<SVGSVGElement | null>(null);
  const [unit, setUnit] = useState(widthPx / 400);
  useEffect(() => {
    const element = surface.current;
    if (!element) return;
    const measure = () => setUnit(widthPx / Math.max(1, element.getBoundingClientRect().width));
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    measure();
    return () => observer.disconnect();
  }, [widthPx, zoom]);
  return { surface, unit };
}

/** A photo to draw on. Everything that drawing does, keys and the list beside it do too. */
export function MarkCanvas({ photo, history, act, selected, onSelect, isReadOnly }: Props) {
  const { widthPx, heightPx } = photo;
  const [tool, setTool] = useState<Tool>('look');
  const [zoom, setZoom] = useState(1);
  const [moving, setMoving] = useState<Mark | null>(null);
  const [isHelp, setHelp] = useState(false);
  const { surface, unit } = useUnit(widthPx, zoom);
  const ink = useRef<SVGPathElement | null>(null);
  const { marks } = history;
  const chosen = marks.find(({ id }) => id === selected) ?? null;

  const onDrawn = (points: PhotoPoint[]) => {
    if (tool === 'look') return;
    const id = v7();
    act((now) => addMark(now, newMark(id, tool, 2, points)));
    onSelect(id);
  };
  const onTool = (next: Tool) => {
    setTool(next);
    drawing.forgetTap();
    if (next !== 'look') onSelect(null);
  };
  const onDelete = (id: string) => {
    act((now) => removeMark(now, id));
    onSelect(null);
  };
  const drawing = useDrawing({ surface, ink, tool, widthPx, heightPx, onDrawn });
  const keys = useKeyDrawing({
    tool,
    selected: chosen,
    onTool,
    onDrawn,
    onDelete,
    onSelect,
    onEdit: (id, edit) => act((now) => editMark(now, id, edit)),
    onUndo: () => act(undo),
    onRedo: () => act(redo),
    onHelp: () => setHelp(true),
  });
  const dot = (point: PhotoPoint | null, shape: 'cross' | 'dot') =>
    point ? <Cross x={point.x * widthPx} y={point.y * heightPx} unit={unit} isDot={shape === 'dot'} /> : null;

  return (
    <div className="grid gap-2">
      <div className="max-h-[80vh] overflow-auto bg-weave" tabIndex={-1}>
        <div
          className="relative mx-auto"
          style={{ width: `${zoom * 100}%`, aspectRatio: `${widthPx} / ${heightPx}` }}
        >
          <img
            src={photo.src}
            srcSet={photo.srcSet}
            sizes={`(min-width: 64rem) ${Math.round(50 * zoom)}vw, ${Math.round(100 * zoom)}vw`}
            width={widthPx}
            height={heightPx}
            alt={photo.alt}
            draggable={false}
            className="absolute inset-0 h-full w-full select-none"
          />
          <svg
            ref={surface}
            role="application"
            aria-label={`${photo.alt}. Draw with the keys: press question mark to hear them.`}
            tabIndex={isReadOnly ? -1 : 0}
            viewBox={`0 0 ${widthPx} ${heightPx}`}
            className={
              tool === 'look'
                ? 'absolute inset-0 h-full w-full'
                : 'absolute inset-0 h-full w-full cursor-crosshair touch-none'
            }
            onKeyDown={isReadOnly ? undefined : keys.onKeyDown}
            {...(isReadOnly ? {} : drawing.handlers)}
          >
            {marks.map((mark) =>
              mark.id === selected ? null : (
                <g
                  key={mark.id}
                  onClick={() => tool === 'look' && onSelect(mark.id)}
                  className={tool === 'look' ? 'cursor-pointer' : ''}
                >
                  <title>{markText(mark)}</title>
                  <polyline
                    points={mark.points.map(({ x, y }) => `${x * widthPx},${y * heightPx}`).join(' ')}
                    fill="none"
                    stroke="transparent"
                    strokeWidth={28 * unit}
                    strokeLinecap="round"
                  />
                  <MarkShape mark={mark} widthPx={widthPx} heightPx={heightPx} unit={unit} />
                </g>
              ),
            )}
            {chosen && !isReadOnly ? (
              <MarkHandles
                mark={moving ?? chosen}
                surface={surface}
                widthPx={widthPx}
                heightPx={heightPx}
                unit={unit}
                onMoving={setMoving}
                onMoved={(moved) => act((now) => editMark(now, moved.id, () => moved))}
              />
            ) : null}
            <path
              ref={ink}
              fill="none"
              stroke="#0b4f7a"
              strokeWidth={3.5 * unit}
              strokeLinecap="round"
              strokeLinejoin="round"
            />
            {dot(drawing.firstTap ?? keys.start, 'dot')}
            {dot(keys.cross, 'cross')}
          </svg>
        </div>
      </div>
      {isReadOnly ? null : (
        <MarkToolbar
          tool={tool}
          onTool={onTool}
          canUndo={history.past.length > 0}
          canRedo={history.future.length > 0}
          onUndo={() => act(undo)}
          onRedo={() => act(redo)}
          onZoom={(by) => setZoom((now) => Math.min(ZOOM_MAX, Math.max(1, now * by)))}
        />
      )}
      <KeyHelp isOpen={isHelp} onClose={() => setHelp(false)} />
    </div>
  );
}

function Cross({ x, y, unit, isDot }: { x: number; y: number; unit: number; isDot: boolean }) {
  const arm = 14 * unit;
  const d = isDot ? '' : `M${x - arm} ${y}H${x + arm}M${x} ${y - arm}V${y + arm}`;
  return (
    <g fill="none" pointerEvents="none">
      <path d={d} stroke="#10141c" strokeWidth={5 * unit} />
      <path d={d} stroke="#ffffff" strokeWidth={2 * unit} />
      <circle cx={x} cy={y} r={6 * unit} fill="#ffffffaa" stroke="#10141c" strokeWidth={2 * unit} />
    </g>
  );
}
