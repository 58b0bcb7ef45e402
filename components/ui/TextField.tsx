import { type ComponentProps, type ReactNode, useId } from 'react';
import { FIELD, join } from './styles';

type Props = Omit<ComponentProps<'input'>, 'id'> & {
  label: string;
  hint?: ReactNode;
  error?: string | undefined;
};

export function TextField({ label, hint, error, className, ...rest }: Props) {
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
      <input
        id={id}
        className={FIELD}
        aria-invalid={error ? true : undefined}
        aria-describedby={described || undefined}
        {...rest}
      />
      {error ? (
        <p id={`${id}-error`} className="font-bold text-pin">
          {error}
        </p>
      ) : null}
    </div>
  );
}
