import { useId } from 'react';
import { MarkShape } from '@/components/marks-shapes/MarkShape';
import type { MarkKind, MarkStrength } from '@/components/marks-shapes/mark-paths';
import { floorY } from '@/diagnosis/figure/body';
import { figureZones, landmarks, type FigureView, type ZoneAt } from '@/diagnosis/figure/figure';
import { figurePoint, type FigurePoint } from '@/diagnosis/figure/point';
import type { Proportions } from '@/diagnosis/figure/proportions';
import { drawingSpace, UNIT } from './drawing-space';
import { BareBody, BodyLines, BodyParts, FormLines } from './FigureBody';
import { FigureTrousers } from './FigureTrousers';
import { FigureZones } from './FigureZones';
import { polygonPath } from './polygon-path';

/** A mark in figure coordinates. `label` is what a screen reader says of it. */
export type FigureMark = {
  id: string;
  kind: MarkKind;
  strength: MarkStrength;
  points: readonly FigurePoint[];
  label: string;
};

type Props = {
  view: FigureView;
  proportions: Proportions;
  /** Says what the drawing shows: "Front of the figure". */
  title: string;
  /** Only the front and the back can be drawn without. */
  withTrousers?: boolean;
  highlighted?: readonly ZoneAt[];
  marks?: readonly FigureMark[];
  /** Ids of the landmarks to show as chalk points. */
  shownLandmarks?: readonly string[];
  /** Makes the zones buttons. */
  onTapZone?: (zone: ZoneAt) => void;
  className?: string;
};

const FADE_FROM_Y = -0.95;

/** The drawn figure in one view: a body in thin line, the trousers in full line, and what lies on them. Colours come from the theme. */
export function Figure(props: Props) {
  const { view, proportions, title, withTrousers = true, highlighted = [], marks = [] } = props;
  const { shownLandmarks = [], onTapZone, className } = props;
  const id = useId();
  const space = drawingSpace(view, proportions);
  const shared = { view, proportions, space };
  const isDressed = withTrousers || (view !== 'front' && view !== 'back');
  const shownZones = figureZones(view, proportions).filter(({ zone, side }) =>
    highlighted.some((one) => one.zone === zone && one.side === side),
  );
  return (
    <svg
      viewBox={space.viewBox}
      className={className}
      role={onTapZone ? 'group' : 'img'}
      aria-labelledby={`${id}-title`}
    >
      <title id={`${id}-title`}>{title}</title>
      <Fade id={`${id}-fade`} width={space.width} />
      <Ground {...shared} />
      <g mask={`url(#${id}-fade)`}>
        {isDressed ? <Dressed {...shared} /> : <BareBody {...shared} />}
        <BodyParts {...shared} parts={['arm']} />
        <BodyLines {...shared} />
      </g>
      {shownZones.map(({ zone, side, polygon }) => (
        <path
          key={`${zone}-${side}`}
          d={polygonPath(polygon, space)}
          fill="var(--chalk, #1f5f8b)"
          opacity={0.28}
        />
      ))}
      {onTapZone ? <FigureZones {...shared} selected={highlighted} onTapZone={onTapZone} /> : null}
      {marks.map(({ id: key, kind, strength, points, label }) => (
        <MarkShape key={key} kind={kind} strength={strength} points={points.map(space.place)} label={label} />
      ))}
      <Landmarks {...shared} shown={shownLandmarks} />
    </svg>
  );
}

type Shared = { view: FigureView; proportions: Proportions; space: ReturnType<typeof drawingSpace> };

function Dressed(shared: Shared) {
  return (
    <>
      <BodyParts {...shared} parts={['foot', 'torso']} />
      <FigureTrousers {...shared} />
      <FormLines {...shared} />
    </>
  );
}

/** The body is not finished above the chest: it fades, as nobody is asked for more. */
function Fade({ id, width }: { id: string; width: number }) {
  const height = 40 * UNIT;
  return (
    <defs>
      <linearGradient id={`${id}-ramp`} x1="0" y1="0" x2="0" y2={(FADE_FROM_Y + 1.85) * UNIT} gradientUnits="userSpaceOnUse">
        <stop offset="0.02" stopColor="black" />
        <stop offset="1" stopColor="white" />
      </linearGradient>
      <mask id={id} maskUnits="userSpaceOnUse" x={0} y={0} width={width} height={height}>
        <rect width={width} height={height} fill={`url(#${id}-ramp)`} />
      </mask>
    </defs>
  ); // prettier-ignore
}

/** A floor line, and the seat under a seated figure. */
function Ground({ view, proportions, space }: Shared) {
  const floor = floorY(view, proportions);
  const at = (x: number, y: number) => space.place(figurePoint(x, y));
  const y = at(0, floor).y + 2;
  const line = {
    stroke: 'var(--graphite, #4a5360)',
    strokeWidth: 1,
    vectorEffect: 'non-scaling-stroke',
  } as const;
  const [front, back] = [at(0.92, 1), at(-0.66, 1)];
  const left = Math.min(front.x, back.x);
  return (
    <g {...line} fill="none" strokeLinecap="round">
      <line x1={space.width * 0.04} x2={space.width * 0.96} y1={y} y2={y} {...line} />
      {view === 'seated' ? (
        <path d={`M${left} ${front.y + 3}h${Math.abs(front.x - back.x)}v9h${-Math.abs(front.x - back.x)}ZM${left + 12} ${front.y + 12}V${y}M${left + Math.abs(front.x - back.x) - 12} ${front.y + 12}V${y}`} {...line} />
      ) : null}
    </g>
  ); // prettier-ignore
}

function Landmarks({ view, proportions, space, shown }: Shared & { shown: readonly string[] }) {
  return landmarks(view, proportions)
    .filter(({ id }) => shown.includes(id))
    .map(({ id, at }) => {
      const { x, y } = space.place(at);
      return (
        <circle
          key={id}
          cx={x}
          cy={y}
          r={4.5}
          fill="var(--paper, #fffdf8)"
          stroke="var(--chalk, #1f5f8b)"
          strokeWidth={2.5}
          data-landmark={id}
        />
      );
    });
}
