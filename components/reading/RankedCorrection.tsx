'use client';
import { HowTo } from '@/components/plan/HowTo';
import type { Proposal } from '@/components/plan/usePlan';
import { amountWithBasis } from '@/components/tape/basis-words';
import { snapMm } from '@/components/tape/stops';
import { Button } from '@/components/ui/Button';
import type { Correction } from '@/diagnosis/garments/schema';
import type { CorrectionRow } from '@/diagnosis/reading';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { ReasonList } from './ReasonList';
import { rangeWords, sideWords } from './words';

interface Props {
  row: CorrectionRow;
  correction: Correction;
  unit: LengthUnit;
  isPlanned: boolean;
  /** Absent for someone who may only read. */
  onTake?: (proposal: Proposal) => void;
}

const BEYOND = {
  'another-size': 'This is more than a change of this draft should be: look at another size first.',
  'another-draft': 'This is more than a change of this draft should be: another draft will need fewer.',
} as const;

/** A change that would help: how sure, how much in all, how much now, and why. */
export function RankedCorrection({ row, correction, unit, isPlanned, onTake }: Props) {
  const now = row.amountMm === null ? null : snapMm(row.amountMm, unit);
  const take = () =>
    onTake?.({ correction: row.correction, side: row.side, basis: row.basis, amountMm: now });
  return (
    <li className="grid gap-2 border-l-4 border-seam pl-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-3">
        <h3 className="font-bold">
          {row.name}
          {sideWords(row.side)}
        </h3>
        <span className="text-sm text-graphite">{row.word}</span>
      </div>
      {now !== null && correction.amounts ? (
        <p>
          This round {amountWithBasis(now, correction.amounts, unit)}.
          {row.estimateMm ? (
            <span className="text-graphite"> In all {rangeWords(row.estimateMm, unit)}.</span>
          ) : null}
        </p>
      ) : (
        <p>{correction.description}</p>
      )}
      {row.beyond ? <p className="border-l-4 border-basting pl-3">{BEYOND[row.beyond]}</p> : null}
      <ReasonList because={row.because} against={row.against} />
      <HowTo correction={correction} />
      {onTake ? (
        <div>
          {isPlanned ? (
            <p className="font-bold">In the plan</p>
          ) : (
            <Button onClick={take} aria-label={`Take it into the plan: ${row.name}`}>
              Take it into the plan
            </Button>
          )}
        </div>
      ) : null}
    </li>
  );
}
