import { type ComponentProps, useId } from 'react';
import { FIELD, join } from './styles';

type Props = Omit<ComponentProps<'textarea'>, 'id'> & { label: string };

export function TextArea({ label, className, ...rest }: Props) {
  const id = useId();
  return (
    <div className={join('grid gap-1', className)}>
      <label htmlFor={id} className="font-bold">
        {label}
      </label>
      <textarea id={id} rows={3} className={FIELD} {...rest} />
    </div>
  );
}
