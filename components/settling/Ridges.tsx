import type { SettledRound, SettlingRow } from '@/diagnosis/settling';

const WIDTH = 320;
const MIDDLE = WIDTH / 2;
const ROUND_HEIGHT = 30;
const RIDGE_HEIGHT = 24;
/** Beyond this share of its height a ridge is drawn; what is flatter does not widen the picture. */
const SEEN = 0.03;

/** Millimetres from the middle that the picture reaches: as far as a ridge is seen, and past the tolerance. */
function reachOf({ atMm, toleranceMm, rounds }: SettlingRow): number {
  const seen = rounds.flatMap(({ ridge }) =>
    ridge.flatMap((height, i) => (height > SEEN ? [Math.abs(atMm[i]!)] : [])),
  );
  return Math.max(2.5 * toleranceMm, ...seen);
}

function ridgePath({ ridge }: SettledRound, xs: readonly number[], baseline: number): string {
  const points = ridge.map(
    (height, i) => `${xs[i]!.toFixed(1)} ${(baseline - RIDGE_HEIGHT * height).toFixed(1)}`,
  );
  return `M${xs[0]!.toFixed(1)} ${baseline} L${points.join(' L')} L${xs.at(-1)!.toFixed(1)} ${baseline}Z`;
}

/** One need over the rounds, oldest above: the belief as a soft ridge, what fits marked as a band in the middle. */
export function Ridges({ row }: { row: SettlingRow }) {
  const { rounds, atMm, toleranceMm } = row;
  const scale = (MIDDLE - 4) / reachOf(row);
  const xs = atMm.map((mm) => MIDDLE + mm * scale);
  const height = rounds.length * ROUND_HEIGHT + 6;
  return (
    <svg viewBox={`0 0 ${WIDTH} ${height}`} aria-hidden className="block w-full max-w-md overflow-hidden">
      <rect
        x={MIDDLE - toleranceMm * scale}
        width={2 * toleranceMm * scale}
        height={height}
        fill="var(--weave)"
      />
      <line x1={MIDDLE} x2={MIDDLE} y2={height} stroke="var(--seam)" strokeDasharray="5 4" />
      {rounds.map((round, i) => {
        const baseline = (i + 1) * ROUND_HEIGHT;
        const isLast = i === rounds.length - 1;
        return (
          <g key={i}>
            <line x2={WIDTH} y1={baseline} y2={baseline} stroke="var(--line)" />
            <path
              d={ridgePath(round, xs, baseline)}
              fill={isLast ? 'var(--chalk)' : 'var(--graphite)'}
              fillOpacity={isLast ? 0.75 : 0.35}
              stroke={isLast ? 'var(--chalk)' : 'var(--graphite)'}
            />
          </g>
        );
      })}
    </svg>
  );
}
