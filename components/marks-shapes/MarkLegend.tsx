import { MarkShape } from './MarkShape';
import type { MarkKind, MarkStrength } from './mark-paths';

const WIDTH_PX = 64;
const HEIGHT_PX = 28;

/** A mark as a small picture beside its name: in lists, keys, the handbook. Decoration: the name stands next to it. */
export function MarkLegend({ kind, strength = 'clear' }: { kind: MarkKind; strength?: MarkStrength }) {
  const points = [
    { x: 12, y: HEIGHT_PX / 2 },
    { x: WIDTH_PX - 12, y: HEIGHT_PX / 2 },
  ];
  return (
    <svg width={WIDTH_PX} height={HEIGHT_PX} viewBox={`0 0 ${WIDTH_PX} ${HEIGHT_PX}`} aria-hidden>
      <MarkShape kind={kind} points={points} strength={strength} rimmed={false} />
    </svg>
  );
}
