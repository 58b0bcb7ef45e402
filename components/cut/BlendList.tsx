import { Amount } from '@/components/ui/Amount';
import type { Blend } from '@/diagnosis/sizing/blend';
import { sizeWords } from '@/diagnosis/sizing/levels';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

/** Where the cutting line leaves the size that is cut: on each edge, with its sum round. */
export function BlendList({ blends, unit }: { blends: readonly Blend[]; unit: LengthUnit }) {
  if (blends.length === 0) return null;
  return (
    <div className="grid max-w-2xl gap-2">
      <h3 className="font-bold">Blend</h3>
      <ul className="grid list-disc gap-1 pl-5">
        {blends.map(({ measure, name, to, perEdgeMm, edges, roundMm, where, isContinued }) => (
          <li key={measure}>
            {name}, to {sizeWords(to)}: <Amount mm={Math.abs(perEdgeMm)} unit={unit} />{' '}
            {roundMm >= 0 ? 'out' : 'in'} on each of {edges} edges ({where}), <Amount mm={Math.abs(roundMm)} unit={unit} /> round
            {isContinued ? '. The chart does not go so far: its last step was carried on' : ''}.
          </li>
        ))}
      </ul>
      <p className="text-sm text-graphite">
        Draw from one level to the next in a smooth line, the change spread over a hand’s length; the seams beside it must
        stay as long as each other.
      </p>
    </div>
  );
} // prettier-ignore
