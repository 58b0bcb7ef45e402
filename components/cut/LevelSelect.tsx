'use client';
import { useState } from 'react';
import { FIELD } from '@/components/ui/styles';
import type { MeasureId } from '@/diagnosis/measuring/measures';
import { useCutEdit } from './CutEdits';

interface Props {
  measure: MeasureId;
  name: string;
  options: { size: string; steps: number; words: string }[];
  chosen: string;
}

/** Another size at one level. */
export function LevelSelect({ measure, name, options, chosen }: Props) {
  const edit = useCutEdit();
  const [shown, setShown] = useState(chosen);
  return (
    <select
      aria-label={`Size at the ${name.toLowerCase()}`}
      className={FIELD}
      value={shown}
      onChange={(event) => {
        const found = options.find(({ words }) => words === event.target.value);
        if (!found) return;
        setShown(found.words);
        const { size, steps } = found;
        edit(({ sizes }) => ({ sizes: { ...sizes, [measure]: { size, steps } } }));
      }}
    >
      {options.map(({ words }) => (
        <option key={words}>{words}</option>
      ))}
    </select>
  );
}
