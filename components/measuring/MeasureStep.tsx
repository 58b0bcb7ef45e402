'use client';
import { Button } from '@/components/ui/Button';
import { Section } from '@/components/ui/Section';
import { TextField } from '@/components/ui/TextField';
import { MEASURES } from '@/diagnosis/measuring/measures';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { TAKES_MAX } from '../wearers/measurement-schema';
import { Keypad } from './Keypad';
import { MeasureFigure } from './MeasureFigure';
import { type SittingState, STEP_ID } from './useSitting';

interface Props {
  state: SittingState;
  unit: LengthUnit;
  /** What was typed last time; empty where there was nothing, or it is hidden. */
  last: string[];
}

/** One measure: where, how, its takes, and keys for one thumb. */
export function MeasureStep({ state, unit, last }: Props) {
  const { measure, takes, at, type } = state;
  const now = takes.at(-1) ?? '';
  return (
    <Section title={measure.name} id={STEP_ID}>
      <MeasureFigure measure={measure} />
      <p className="max-w-prose">{measure.how}</p>
      {takes.map((typed, take) => (
        <TextField
          key={`${measure.id} ${take}`}
          label={takes.length > 1 ? `${measure.name}, take ${take + 1}` : `${measure.name} in ${unit}`}
          hint={take === 0 && last.length > 0 ? `Last time: ${last.join(', ')}` : undefined}
          inputMode={unit === 'cm' ? 'decimal' : 'text'}
          autoComplete="off"
          maxLength={24}
          error={take === takes.length - 1 ? (state.error ?? undefined) : undefined}
          value={typed}
          onChange={(event) => type(event.target.value, take)}
        />
      ))}
      <Keypad unit={unit} onKey={(key) => type(now + key)} onErase={() => type([...now].slice(0, -1).join(''))} />
      <div className="flex flex-wrap gap-2">
        <Button onClick={() => state.go(at - 1)} disabled={at === 0}>
          Back
        </Button>
        <Button
          onClick={state.again}
          disabled={now.trim() === '' || state.error !== null || takes.length >= TAKES_MAX}
        >
          Take it again
        </Button>
        <Button onClick={() => state.go(at + 1)} disabled={at === MEASURES.length - 1}>
          {now.trim() === '' ? 'Leave it out' : 'Next'}
        </Button>
      </div>
    </Section>
  );
} // prettier-ignore
