'use client';
import { basisPlace, type BasisOf } from '@/components/tape/basis-words';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';

export interface PlannedChange {
  id: string;
  /** As the knowledge names it, and what its amount is of. */
  name: string;
  of: BasisOf | null;
  side: 'left' | 'right' | 'both';
  plannedMm: number | null;
  version: number;
}

export interface Made {
  isMade: boolean;
  typed: string;
}

interface Props {
  planned: PlannedChange[];
  unit: LengthUnit;
  made: Record<string, Made>;
  onChange: (id: string, made: Made) => void;
}

export const plannedText = (change: PlannedChange, unit: LengthUnit) =>
  change.plannedMm === null ? '' : amountText(change.plannedMm, unit);

/** Before the next round: how much was really made of each change. A plan is not what was cut. */
export function MadeList({ planned, unit, made, onChange }: Props) {
  return (
    <ul className="grid gap-4">
      {planned.map((change) => {
        const now = made[change.id] ?? { isMade: true, typed: plannedText(change, unit) };
        const side = change.side === 'both' ? '' : `, your ${change.side}`;
        return (
          <li key={change.id} className="grid gap-2 border-l-4 border-seam pl-4">
            <Tick
              label={`${change.name}${side}`}
              checked={now.isMade}
              onChange={(event) => onChange(change.id, { ...now, isMade: event.target.checked })}
            />
            {change.plannedMm !== null && now.isMade ? (
              <TextField
                className="max-w-60"
                label={`Really made, ${change.of ? basisPlace(change.of) : 'in all'}`}
                hint={`Planned: ${plannedText(change, unit)}. Measure the changed seam.`}
                autoComplete="off"
                value={now.typed}
                onChange={(event) => onChange(change.id, { ...now, typed: event.target.value })}
              />
            ) : null}
          </li>
        );
      })}
    </ul>
  );
}
