'use client';
import { type FormEvent, useState } from 'react';
import type { CutChoices } from '@/db/queries/cuts';
import { Button } from '@/components/ui/Button';
import { Disclosure } from '@/components/ui/Disclosure';
import { TextField } from '@/components/ui/TextField';
import type { MeasureId } from '@/diagnosis/measuring/measures';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';
import { useCutEdit } from './CutEdits';

interface Props {
  levels: readonly { measure: MeasureId; name: string }[];
  ease: CutChoices['ease'];
  unit: LengthUnit;
}

/** Another ease than the draft's, level by level; an empty field leaves the draft's. */
export function EaseForm({ levels, ease, unit }: Props) {
  const edit = useCutEdit();
  const [texts, setTexts] = useState<Record<string, string>>(
    Object.fromEntries(levels.map(({ measure }) => [measure, ease[measure]?.typed ?? ''])),
  );
  const [isTried, setTried] = useState(false);
  const errorOf = (typed: string) => {
    const read = typed.trim() === '' ? null : parseAmount(typed, unit);
    return read === null || read.kind === 'amount' ? undefined : read.message;
  };
  const save = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    const filled = levels.filter(({ measure }) => (texts[measure] ?? '').trim() !== '');
    if (filled.some(({ measure }) => errorOf(texts[measure] ?? ''))) return;
    edit(() => ({
      ease: Object.fromEntries(
        filled.map(({ measure }) => [measure, { typed: texts[measure]!.trim(), unit }]),
      ),
    }));
  };
  return (
    <Disclosure summary="Do you want it closer or looser?">
      <form noValidate onSubmit={save} className="grid max-w-xl gap-3">
        {levels.map(({ measure, name }) => (
          <TextField
            key={measure}
            label={`Ease at the ${name.toLowerCase()}`}
            placeholder={unit}
            autoComplete="off"
            maxLength={24}
            error={isTried ? errorOf(texts[measure] ?? '') : undefined}
            value={texts[measure] ?? ''}
            onChange={(event) => setTexts((all) => ({ ...all, [measure]: event.target.value }))}
          />
        ))}
        <Button type="submit" className="justify-self-start">
          Use this ease
        </Button>
      </form>
    </Disclosure>
  );
}
