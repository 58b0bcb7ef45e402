'use client';
import { useState } from 'react';
import { Amount } from '@/components/ui/Amount';
import { Disclosure } from '@/components/ui/Disclosure';
import { TextField } from '@/components/ui/TextField';
import { cutForShrinkageMm, shrinkagePercent } from '@/diagnosis/ease/stretch';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';

const mmOf = (text: string, unit: LengthUnit): number | null => {
  const read = parseAmount(text, unit);
  return read.kind === 'amount' && read.mm > 0 ? read.mm : null;
};

/** A washed square tells how much longer to cut, where the cloth cannot be washed first. */
export function Shrinkage({ unit }: { unit: LengthUnit }) {
  const [before, setBefore] = useState('');
  const [after, setAfter] = useState('');
  const [from, to] = [mmOf(before, unit), mmOf(after, unit)];
  const percent = from !== null && to !== null ? shrinkagePercent(from, to) : null;
  return (
    <Disclosure summary="Will it shrink?">
      <p className="max-w-prose">
        Wash and dry the good cloth before it is cut. Where that cannot be, wash a square and measure it
        along the grain.
      </p>
      <div className="grid max-w-xl gap-3 sm:grid-cols-2">
        <TextField label="Square before" placeholder={unit} autoComplete="off" value={before} onChange={(event) => setBefore(event.target.value)} />
        <TextField label="Square after" placeholder={unit} autoComplete="off" value={after} onChange={(event) => setAfter(event.target.value)} />
      </div>
      {percent === null ? null : (
        <p role="status">
          It shrinks by {(Math.round(percent * 10) / 10).toString()} %. To keep{' '}
          <Amount mm={1000} unit={unit} /> cut <Amount mm={cutForShrinkageMm(1000, percent)} unit={unit} />.
        </p>
      )}
    </Disclosure>
  );
} // prettier-ignore
