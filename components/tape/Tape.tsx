'use client';
import { Minus, Plus } from 'lucide-react';
import { useId, useState } from 'react';
import { Button } from '@/components/ui/Button';
import { TextField } from '@/components/ui/TextField';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';
import { basisPlace, basisSum, type BasisOf } from './basis-words';
import { type Stops, stopsIn } from './stops';
import { TapeDrawing } from './TapeDrawing';

interface Props {
  label: string;
  valueMm: number;
  onChange: (mm: number) => void;
  /** The table's amounts for this body, mm. */
  amounts: Stops;
  of: BasisOf;
  unit: LengthUnit;
}

/** An amount set on a drawn tape: by sliding, by steps, or typed. What it is of, and what it comes to, stands beside it always. */
export function Tape({ label, valueMm, onChange, amounts, of, unit }: Props) {
  const id = useId();
  const stops = stopsIn(unit, amounts);
  const untilMm = Math.max(stops.capRoundMm * 1.35, stops.capRoundMm + 4 * stops.stepMm, valueMm * 1.1);
  const spoken = [amountText(valueMm, unit), basisPlace(of), basisSum(valueMm, of, unit)]
    .filter(Boolean)
    .join(' ');
  const step = (by: number) => onChange(Math.max(stops.stepMm, valueMm + by * stops.stepMm));
  return (
    <div className="grid gap-2">
      <label htmlFor={id} className="font-bold">
        {label}
      </label>
      <p className="text-lg" aria-live="polite">
        {spoken}
      </p>
      <div className="relative px-5">
        <TapeDrawing valueMm={valueMm} untilMm={untilMm} stops={stops} unit={unit} />
        <input
          id={id}
          type="range"
          min={0}
          max={untilMm}
          step={stops.stepMm}
          value={valueMm}
          aria-valuetext={spoken}
          onChange={(event) => onChange(Math.max(stops.stepMm, Number(event.target.value)))}
          className="tape-range absolute inset-x-0 top-5 h-14"
        />
      </div>
      <div className="flex flex-wrap items-end gap-3">
        <Button onClick={() => step(-1)} disabled={valueMm <= stops.stepMm} aria-label="A step less">
          <Minus aria-hidden size={20} />
        </Button>
        <Button onClick={() => step(1)} aria-label="A step more">
          <Plus aria-hidden size={20} />
        </Button>
        <TypedAmount unit={unit} valueMm={valueMm} onChange={onChange} />
      </div>
      {valueMm > stops.capRoundMm + 1e-6 ? (
        <p className="border-l-4 border-basting bg-paper px-3 py-2">
          Past the stop mark of {amountText(stops.capRoundMm, unit)} for one round. Small steps show what each
          did.
        </p>
      ) : null}
    </div>
  );
}

function TypedAmount({ unit, valueMm, onChange }: Pick<Props, 'unit' | 'valueMm' | 'onChange'>) {
  const [draft, setDraft] = useState<string | null>(null);
  const parsed = draft === null ? null : parseAmount(draft, unit);
  const error = parsed && parsed.kind !== 'amount' && draft !== '' ? parsed.message : undefined;
  return (
    <TextField
      className="w-40"
      label="or type it"
      autoComplete="off"
      value={draft ?? amountText(valueMm, unit)}
      error={error}
      onFocus={(event) => event.target.select()}
      onChange={(event) => {
        setDraft(event.target.value);
        const typed = parseAmount(event.target.value, unit);
        if (typed.kind === 'amount' && typed.mm > 0) onChange(typed.mm);
      }}
      onBlur={() => setDraft(null)}
    />
  );
}
