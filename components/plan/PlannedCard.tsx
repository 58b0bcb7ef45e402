'use client';
import { Tape } from '@/components/tape/Tape';
import { stopsIn } from '@/components/tape/stops';
import { Button } from '@/components/ui/Button';
import { TextArea } from '@/components/ui/TextArea';
import type { ChangeFact } from '@/db/queries/round-facts';
import type { Correction } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { sideWords } from '@/components/reading/words';
import { PieceChangeView } from '@/components/pattern/PieceChangeView';
import { Disclosure } from '@/components/ui/Disclosure';
import type { CaseInput } from '@/diagnosis/case-schema';
import { HowTo } from './HowTo';

interface Props {
  change: ChangeFact;
  correction: Correction;
  /** The table's amounts for this body; those of the reading where it has them. */
  stops: { firstMm: number; capRoundMm: number; capTotalMm: number } | null;
  /** What the block that stands in for the pattern is drafted to. */
  fitted: Pick<CaseInput, 'body' | 'cloth'>;
  unit: LengthUnit;
  onSet: (edit: { plannedMm?: number; reason?: string }) => void;
  onDrop: () => void;
}

/** One change of the plan: how much, of what, and how it is done on the paper. */
export function PlannedCard({ change, correction, stops, fitted, unit, onSet, onDrop }: Props) {
  const { amounts } = correction;
  const { plannedMm } = change;
  const isPast =
    amounts && plannedMm !== null && plannedMm > stopsIn(unit, { ...amounts, ...stops }).capRoundMm + 1e-6;
  return (
    <li className="grid gap-3 border-l-4 border-chalk bg-paper px-4 py-3">
      <h3 className="font-bold">
        {correction.name}
        {sideWords(change.side)}
      </h3>
      {amounts && plannedMm !== null ? (
        <Tape
          label="How much"
          valueMm={plannedMm}
          onChange={(mm) => onSet({ plannedMm: mm })}
          amounts={{ ...amounts, ...stops }}
          of={amounts}
          unit={unit}
        />
      ) : (
        <p>{correction.description}</p>
      )}
      {isPast ? (
        <TextArea
          label="Why more than the stop mark?"
          value={change.reason}
          maxLength={400}
          onChange={(event) => onSet({ reason: event.target.value })}
        />
      ) : null}
      {amounts && plannedMm !== null ? (
        <Disclosure summary="On the pattern piece">
          <PieceChangeView
            correction={correction.id}
            name={correction.name}
            amountMm={plannedMm}
            side={change.side}
            unit={unit}
            body={fitted.body}
            cloth={fitted.cloth}
          />
        </Disclosure>
      ) : null}
      <HowTo correction={correction} />
      <div>
        <Button look="quiet" onClick={onDrop}>
          Take it out of the plan
        </Button>
      </div>
    </li>
  );
}
