import type { ComponentProps } from 'react';
import { Labelled, type LabelProps } from './Labelled';
import { FIELD } from './styles';

type Props = Omit<ComponentProps<'input'>, 'id'> & LabelProps;

export function TextField({ label, hint, error, className, ...rest }: Props) {
  return (
    <Labelled label={label} hint={hint} error={error} className={className}>
      {(tied) => <input className={FIELD} {...tied} {...rest} />}
    </Labelled>
  );
}
