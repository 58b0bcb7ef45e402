import { amountWithBasis } from '@/components/tape/basis-words';
import type { Suggestion } from '@/diagnosis/flat-check/suggest';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { snapMm } from './snap';

/** What to change on paper and by how much, on what, with its sum: never a bare number. */
export function SuggestionLines({
  suggestions,
  unit,
}: {
  suggestions: readonly Suggestion[];
  unit: LengthUnit;
}) {
  return (
    <ul className="grid gap-1">
      {suggestions.map(({ correction, name, amountMm, basis, conversions, meetsMm }) => (
        <li key={correction}>
          {name}: {amountWithBasis(snapMm(amountMm, unit, meetsMm > 0), { basis, conversions }, unit)}.
        </li>
      ))}
    </ul>
  );
}
