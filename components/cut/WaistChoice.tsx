'use client';
import { useState } from 'react';
import { Choice } from '@/components/ui/Choice';
import { WAIST_PLACES, WAIST_WORDS, type WaistPlace } from '@/diagnosis/measuring/measures';
import { useCutEdit } from './CutEdits';

const OPTIONS = WAIST_PLACES.map((value) => ({ value, label: WAIST_WORDS[value].label }));

/** Lengths from the waist are compared only from the same waist. */
export function WaistChoice({ value }: { value: WaistPlace | null }) {
  const edit = useCutEdit();
  const [shown, setShown] = useState(value);
  return (
    <Choice
      legend="Where is the waist of this pattern to sit?"
      options={OPTIONS}
      value={shown}
      onChange={(patternWaist) => {
        setShown(patternWaist);
        edit(() => ({ patternWaist }));
      }}
    />
  );
}
