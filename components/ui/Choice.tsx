'use client';
import { type ReactNode, useId } from 'react';
import { join } from './styles';

export interface ChoiceOption<T extends string> {
  value: T;
  label: ReactNode;
}

interface Props<T extends string> {
  legend: string;
  hidesLegend?: boolean;
  options: readonly ChoiceOption<T>[];
  value: T | null;
  onChange: (value: T) => void;
  name?: string;
}

/** A few words to choose one of, all in sight; a radio group underneath, so that arrows and forms work as expected. */
export function Choice<T extends string>({ legend, hidesLegend, options, value, onChange, name }: Props<T>) {
  const own = useId();
  return (
    <fieldset className="grid gap-1">
      <legend className={join('mb-1 font-bold', hidesLegend && 'sr-only')}>{legend}</legend>
      <div className="flex flex-wrap gap-2">
        {options.map((option) => (
          <label
            key={option.value}
            className="relative inline-flex min-h-11 items-center rounded-md border-2 border-line bg-paper px-3 py-1.5 has-checked:border-ink has-checked:bg-ink has-checked:font-bold has-checked:text-cloth has-focus-visible:outline-3 has-focus-visible:outline-offset-3 has-focus-visible:outline-chalk"
          >
            <input
              type="radio"
              name={name ?? own}
              value={option.value}
              checked={value === option.value}
              onChange={() => onChange(option.value)}
              className="absolute inset-0 opacity-0"
            />
            {option.label}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
