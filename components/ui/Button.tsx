import type { ComponentProps } from 'react';
import { buttonClass, type ButtonLook } from './styles';

type Props = ComponentProps<'button'> & { look?: ButtonLook };

/** One `chalk` button on a screen; everything else is plain or quiet. */
export function Button({ look = 'plain', type = 'button', className, ...rest }: Props) {
  return <button type={type} className={buttonClass(look, className)} {...rest} />;
}
