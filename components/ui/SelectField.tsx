import type { ComponentProps } from 'react';
import { Labelled, type LabelProps } from './Labelled';
import { FIELD } from './styles';

type Props = Omit<ComponentProps<'select'>, 'id'> & LabelProps;

export function SelectField({ label, hint, error, className, children, ...rest }: Props) {
  return (
    <Labelled label={label} hint={hint} error={error} className={className}>
      {(tied) => (
        <select className={FIELD} {...tied} {...rest}>
          {children}
        </select>
      )}
    </Labelled>
  );
}
