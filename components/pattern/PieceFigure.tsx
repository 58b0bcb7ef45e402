import type { PieceDrawing } from '@/diagnosis/pattern/drawing';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';
import { edgeName, gainText } from './piece-words';

interface Props {
  drawing: PieceDrawing;
  /** What the picture is of, for those who do not see it. */
  label: string;
  unit: LengthUnit;
}

/** A bar of so much paper: a picture to scale says its scale. */
const SCALE_MM = { cm: 50, in: 50.8 } as const;

/** A piece before (dashed) and after over each other; what moved is drawn heavy, with slash, hinge and fold. */
export function PieceFigure({ drawing, label, unit }: Props) {
  const { x, y, width, height } = drawing.box;
  const em = Math.max(width, height) / 22;
  const thin = em / 14;
  const scaleMm = SCALE_MM[unit];
  return (
    <svg
      role="img"
      aria-label={label}
      viewBox={`${x} ${y} ${width} ${height}`}
      className="block max-h-96 w-full bg-cloth"
    >
      <g fill="none" strokeLinecap="round" strokeLinejoin="round">
        <path d={drawing.cutting} stroke="var(--seam)" strokeWidth={thin} />
        <path
          d={drawing.before}
          stroke="var(--line)"
          strokeWidth={thin * 1.5}
          strokeDasharray={`${em / 2} ${em / 3}`}
        />
        <path d={drawing.grain} stroke="var(--seam)" strokeWidth={thin} />
        <path d={drawing.notches} stroke="var(--ink)" strokeWidth={thin * 1.5} />
        <path d={drawing.after} stroke="var(--ink)" strokeWidth={thin * 2} />
        <path d={drawing.darts} stroke="var(--ink)" strokeWidth={thin * 1.5} />
        {drawing.folds.map((d) => (
          <path key={d} d={d} stroke="var(--basting)" strokeWidth={thin} fill="var(--weave)" />
        ))}
        {drawing.slashes.map((d) => (
          <path
            key={d}
            d={d}
            stroke="var(--basting)"
            strokeWidth={thin * 2}
            strokeDasharray={`${em} ${em / 3} ${em / 6} ${em / 3}`}
          />
        ))}
        <path d={drawing.changed} stroke="var(--chalk)" strokeWidth={thin * 4} />
        {drawing.hinges.map((hinge) => (
          <circle
            key={`${hinge.x} ${hinge.y}`}
            cx={hinge.x}
            cy={hinge.y}
            r={em / 4}
            stroke="var(--basting)"
            strokeWidth={thin * 2}
            fill="var(--paper)"
          />
        ))}
      </g>
      <g fontSize={em} stroke="var(--cloth)" strokeWidth={em / 4} paintOrder="stroke" fill="var(--ink)">
        {drawing.labels.map(({ edge, at, byMm }, index) => (
          <text
            key={edge}
            x={at.x < x + width / 2 ? Math.max(x + em / 2, at.x) : Math.min(x + width - em / 2, at.x)}
            y={Math.min(y + height - em * 3, Math.max(y + em * 1.5, at.y + (index % 2) * em * 1.4))}
            textAnchor={at.x < x + width / 2 ? 'start' : 'end'}
          >
            {`${edgeName(edge)} ${gainText(byMm, unit)}`}
          </text>
        ))}
        <text x={x + em * 0.6} y={y + height - em * 1.2} fill="var(--graphite)">
          {amountText(scaleMm, unit)}
        </text>
      </g>
      <path
        d={`M${x + em * 0.6} ${y + height - em * 0.7}h${scaleMm}`}
        stroke="var(--graphite)"
        strokeWidth={thin * 3}
      />
    </svg>
  );
}
