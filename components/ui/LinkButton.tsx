import type { Route } from 'next';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { buttonClass, type ButtonLook } from './styles';

interface Props<T extends string> {
  href: Route<T>;
  look?: ButtonLook;
  children: ReactNode;
}

export function LinkButton<T extends string>({ href, look = 'plain', children }: Props<T>) {
  return (
    <Link href={href} className={buttonClass(look)}>
      {children}
    </Link>
  );
}
