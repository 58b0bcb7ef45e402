import { type ComponentProps, type ReactNode, useId } from 'react';
import { FIELD, join } from './styles';

type Props = Omit<ComponentProps<'select'>, 'id'> & { label: string; hint?: ReactNode };

export function SelectField({ label, hint, className, children, ...rest }: Props) {
  const id = useId();
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
      <select id={id} className={FIELD} aria-describedby={hint ? `${id}-hint` : undefined} {...rest}>
        {children}
      </select>
    </div>
  );
}
