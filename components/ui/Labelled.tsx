import { type ReactNode, useId } from 'react';
import { join } from './styles';

export interface LabelProps {
  label: string;
  hint?: ReactNode;
  error?: string | undefined;
}

interface Props extends LabelProps {
  className?: string | undefined;
  /** The control, given what ties label, hint and error to it. */
  children: (tied: { id: string; 'aria-invalid'?: true; 'aria-describedby'?: string }) => ReactNode;
}

/** A control under its label, with its hint above and what is wrong below. */
export function Labelled({ label, hint, error, className, children }: Props) {
  const id = useId();
  const described = [hint ? `${id}-hint` : '', error ? `${id}-error` : ''].filter(Boolean).join(' ');
  return (
    <div className={join('grid gap-1', className)}>
      <label htmlFor={id} className="font-bold">
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="text-sm text-graphite">
          {hint}
        </p>
      ) : null}
      {children({
        id,
        ...(error ? { 'aria-invalid': true } : {}),
        ...(described ? { 'aria-describedby': described } : {}),
      })}
      {error ? (
        <p id={`${id}-error`} className="font-bold text-pin">
          {error}
        </p>
      ) : null}
    </div>
  );
}
