import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { type Stops, type TapeTick, tapeTicks } from './stops';

const LENGTH_PX: Record<TapeTick['rank'], number> = { 0: 9, 1: 13, 2: 18, 3: 26 };

interface Props {
  valueMm: number;
  untilMm: number;
  stops: Stops;
  unit: LengthUnit;
}

/** A stretch of tape measure: real ticks, the amount taken as a bar along its edge, the stop marks as cuts, hatched beyond. */
export function TapeDrawing({ valueMm, untilMm, stops, unit }: Props) {
  const at = (mm: number) => `${Math.min(100, (mm / untilMm) * 100)}%`;
  const beyond = 100 - Math.min(100, (stops.capRoundMm / untilMm) * 100);
  return (
    <svg width="100%" height="96" aria-hidden className="block overflow-visible">
      <defs>
        <pattern
          id="beyond-stop"
          width="8"
          height="8"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <rect width="3" height="8" fill="var(--basting)" opacity=".55" />
        </pattern>
      </defs>
      <rect x="0" y="26" width="100%" height="44" fill="var(--paper)" stroke="var(--ink)" strokeWidth="1.5" />
      <rect x={at(stops.capRoundMm)} y="27" width={`${beyond}%`} height="42" fill="url(#beyond-stop)" />
      <rect x="0" y="27" width={at(valueMm)} height="6" fill="var(--chalk)" />
      {tapeTicks(unit, untilMm).map((tick) => (
        <g key={tick.mm}>
          <line
            x1={at(tick.mm)}
            x2={at(tick.mm)}
            y1="70"
            y2={70 - LENGTH_PX[tick.rank]}
            stroke="var(--ink)"
            strokeWidth={tick.rank === 3 ? 2 : 1}
          />
          {tick.label && tick.mm < untilMm ? (
            <text x={at(tick.mm)} y="90" textAnchor="middle" fontSize="15" fill="var(--graphite)">
              {tick.label}
            </text>
          ) : null}
        </g>
      ))}
      <Stop at={at(stops.firstMm)} label="first" lean={-4} />
      <Stop at={at(stops.capRoundMm)} label="stop" lean={4} />
    </svg>
  );
}

/** A flag standing on the tape; `first` leans left and `stop` right, so that their words do not meet. */
function Stop({ at, label, lean }: { at: string; label: string; lean: number }) {
  return (
    <g>
      <line x1={at} x2={at} y1="6" y2="70" stroke="var(--ink)" strokeWidth="2" strokeDasharray="4 3" />
      <text x={at} dx={lean} y="18" textAnchor={lean < 0 ? 'end' : 'start'} fontSize="15" fill="var(--ink)">
        {label}
      </text>
    </g>
  );
}
