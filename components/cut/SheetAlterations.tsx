import type { CheckedDifference } from '@/diagnosis/before-the-cut/before-the-cut';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { SuggestionLines } from './SuggestionLines';

interface Props {
  differences: readonly CheckedDifference[];
  unit: LengthUnit;
}

/** What was decided to be altered on paper first. */
export function SheetAlterations({ differences, unit }: Props) {
  const made = differences.flatMap(({ advice, alteredMm }) =>
    advice.kind === 'change' && alteredMm !== 0 ? advice.suggestions : [],
  );
  if (made.length === 0) return <p>Straight from the draft: nothing is altered first.</p>;
  return (
    <>
      <p>Altered on the paper before cutting:</p>
      <SuggestionLines suggestions={made} unit={unit} />
    </>
  );
}
