import type { ComponentProps } from 'react';
import { Labelled, type LabelProps } from './Labelled';
import { FIELD } from './styles';

type Props = Omit<ComponentProps<'textarea'>, 'id'> & LabelProps;

export function TextArea({ label, hint, error, className, ...rest }: Props) {
  return (
    <Labelled label={label} hint={hint} error={error} className={className}>
      {(tied) => <textarea rows={3} className={FIELD} {...tied} {...rest} />}
    </Labelled>
  );
}
