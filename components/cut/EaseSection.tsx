import type { CutChoices } from '@/db/queries/cuts';
import { Amount } from '@/components/ui/Amount';
import type { EaseRow } from '@/diagnosis/before-the-cut/before-the-cut';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { EaseForm } from './EaseForm';

interface Props {
  rows: readonly EaseRow[];
  ease: CutChoices['ease'];
  unit: LengthUnit;
}

/** What the garment adds to the body at each level: to move in, and for the look. */
export function EaseSection({ rows, ease, unit }: Props) {
  if (rows.length === 0)
    return (
      <p className="max-w-prose text-graphite">
        With finished measures, or the paper measured between seamlines, the ease at each level stands here.
      </p>
    );
  return (
    <>
    <ul className="grid max-w-2xl border-t border-seam">
      {rows.map(({ measure, name, totalMm, wearingMm, designMm, isBelowLeast, isJudged }) => (
        <li key={measure} className="border-b border-seam py-2">
          <span className="font-bold">{name}</span>: <Amount mm={totalMm} unit={unit} />
          {totalMm < 0 ? ' (negative: the cloth is stretched here)' : isJudged ? (
            <span className="text-graphite">
              , to move in <Amount mm={wearingMm} unit={unit} />, for the look <Amount mm={designMm} unit={unit} />
            </span>
          ) : null}
          {isJudged && isBelowLeast ? <strong className="block">Less than a woven cloth usually needs to move in.</strong> : null}
        </li>
      ))}
    </ul>
    <EaseForm levels={rows} ease={ease} unit={unit} />
    </>
  );
} // prettier-ignore
