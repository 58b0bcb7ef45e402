'use client';
import { useState } from 'react';
import { useCutEdit } from './CutEdits';

export interface BaseOption {
  size: string;
  steps: number;
  words: string;
  reason: string;
}

interface Props {
  options: BaseOption[];
  chosen: string;
}

/** The size whose paper is cut: what Ruckle would take first, then what else makes sense, each with its reason. */
export function BaseChoice({ options, chosen }: Props) {
  const edit = useCutEdit();
  const [shown, setShown] = useState(chosen);
  return (
    <fieldset className="grid max-w-2xl gap-2">
      <legend className="mb-1 font-bold">Which size to cut</legend>
      {options.map(({ size, steps, words, reason }, at) => (
        <label
          key={words}
          className="flex min-h-11 items-start gap-3 border-2 border-line bg-paper px-3 py-2 has-checked:border-ink has-focus-visible:outline-3 has-focus-visible:outline-offset-3 has-focus-visible:outline-chalk"
        >
          <input
            type="radio"
            name="base"
            className="mt-1 size-5 shrink-0 accent-chalk"
            checked={shown === words}
            onChange={() => {
              setShown(words);
              edit(({ sizes }) => ({ sizes: { ...sizes, base: { size, steps } } }));
            }}
          />
          <span>
            <span className="font-bold">
              Size {words}
              {at === 0 ? ' (proposed)' : ''}
            </span>
            <span className="block text-sm text-graphite">{reason}</span>
          </span>
        </label>
      ))}
    </fieldset>
  );
}
