import type { ReactNode } from 'react';

interface Props {
  title: ReactNode;
  lead?: ReactNode;
  actions?: ReactNode;
}

/** The head of a page: what it is, one line on it, what one can do. */
export function PageHead({ title, lead, actions }: Props) {
  return (
    <header className="mb-6 flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
      <div className="grid min-w-0 gap-1">
        <h1 className="text-2xl [overflow-wrap:anywhere]">{title}</h1>
        {lead ? <p className="max-w-prose text-graphite">{lead}</p> : null}
      </div>
      {actions ? <div className="flex flex-wrap gap-3">{actions}</div> : null}
    </header>
  );
}
