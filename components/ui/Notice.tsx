import type { ReactNode } from 'react';
import { join } from './styles';

const EDGES = {
  care: 'border-basting',
  danger: 'border-pin',
  clean: 'border-moss',
  plain: 'border-line',
} as const;

interface Props {
  tone?: keyof typeof EDGES;
  title?: string;
  children: ReactNode;
  role?: 'status' | 'alert' | 'note';
}

/** A sentence that stands apart. The edge has a colour; the words say it without. */
export function Notice({ tone = 'plain', title, children, role = 'note' }: Props) {
  return (
    <div role={role} className={join('border-l-4 bg-paper px-4 py-3', EDGES[tone])}>
      {title ? <p className="font-bold">{title}</p> : null}
      <div className="max-w-prose">{children}</div>
    </div>
  );
}
