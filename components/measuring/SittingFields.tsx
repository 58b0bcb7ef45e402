'use client';
import { Choice } from '@/components/ui/Choice';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import { WAIST_PLACES, WAIST_WORDS } from '@/diagnosis/measuring/measures';
import type { SittingHead } from './useSitting';

const WAISTS = WAIST_PLACES.map((value) => ({ value, label: WAIST_WORDS[value].label }));

/** When, by whom, and from which waist: the narrowest place and the navel may lie a hand apart. */
export function SittingFields({
  head,
  onChange,
}: {
  head: SittingHead;
  onChange: (head: SittingHead) => void;
}) {
  return (
    <>
      <Choice
        legend="Which waist is meant?"
        options={WAISTS}
        value={head.waistPlace}
        onChange={(waistPlace) => onChange({ ...head, waistPlace })}
      />
      <p className="max-w-prose text-sm text-graphite">
        {WAIST_WORDS[head.waistPlace].how} Every length from the waist starts at that string.
      </p>
      <TextField
        type="date"
        label="Measured on"
        value={head.measuredOn}
        onChange={(event) => onChange({ ...head, measuredOn: event.target.value })}
      />
      <Tick
        label="I take them alone"
        checked={head.takenAlone}
        onChange={(event) => onChange({ ...head, takenAlone: event.target.checked })}
      />
    </>
  );
}
