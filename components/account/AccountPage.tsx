import type { ReactNode } from 'react';

interface Props {
  title: string;
  lead?: ReactNode;
  children: ReactNode;
  foot?: ReactNode;
}

export function AccountPage({ title, lead, children, foot }: Props) {
  return (
    <div className="grid gap-6">
      <header className="grid gap-2">
        <h1 className="text-2xl">{title}</h1>
        {lead ? <p>{lead}</p> : null}
      </header>
      {children}
      {foot ? <p className="basted pt-4">{foot}</p> : null}
    </div>
  );
}
