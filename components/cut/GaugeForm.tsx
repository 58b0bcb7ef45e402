'use client';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/Button';
import { TextField } from '@/components/ui/TextField';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';
import type { CutChoices } from '@/db/queries/cuts';
import { useCutEdit } from './CutEdits';

const FIELDS = [
  { key: 'relaxed', label: 'Relaxed', hint: 'Fold the cloth across, away from the edge, and pin off 10 cm or 4 in.' },
  { key: 'pulled', label: 'Pulled', hint: 'Hold one pin and pull until it resists. Do not fight it.' },
  { key: 'rested', label: 'After half an hour’s rest', hint: 'Optional: how far it came back.' },
] as const; // prettier-ignore

type Texts = Record<(typeof FIELDS)[number]['key'], string>;

/** The folded gauge: three lengths tell stretch, growth and recovery. */
export function GaugeForm({ gauge, unit }: { gauge: CutChoices['gauge']; unit: LengthUnit }) {
  const edit = useCutEdit();
  const [texts, setTexts] = useState<Texts>({
    relaxed: gauge.relaxed?.typed ?? '',
    pulled: gauge.pulled?.typed ?? '',
    rested: gauge.rested?.typed ?? '',
  });
  const [isTried, setTried] = useState(false);
  const filled = FIELDS.filter(({ key }) => texts[key].trim() !== '');
  const errorOf = (text: string) => {
    if (text.trim() === '') return undefined;
    const read = parseAmount(text, unit);
    return read.kind === 'amount' ? undefined : read.message;
  };
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (filled.some(({ key }) => errorOf(texts[key]))) return;
    edit(() => ({
      gauge: Object.fromEntries(filled.map(({ key }) => [key, { typed: texts[key].trim(), unit }])),
    }));
  };
  return (
    <form noValidate onSubmit={save} className="grid max-w-xl gap-3">
      {FIELDS.map(({ key, label, hint }) => (
        <TextField
          key={key}
          label={label}
          hint={hint}
          inputMode={unit === 'cm' ? 'decimal' : 'text'}
          autoComplete="off"
          maxLength={24}
          placeholder={unit}
          error={isTried ? errorOf(texts[key]) : undefined}
          value={texts[key]}
          onChange={(event) => setTexts((all) => ({ ...all, [key]: event.target.value }))}
        />
      ))}
      <Button type="submit" className="justify-self-start">
        Read the gauge
      </Button>
    </form>
  );
}
