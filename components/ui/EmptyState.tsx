import type { ReactNode } from 'react';

/** Nothing here yet: what this place is for, and the first step. */
export function EmptyState({
  title,
  children,
  action,
}: {
  title: string;
  children: ReactNode;
  action?: ReactNode;
}) {
  return (
    <section className="grid max-w-2xl justify-items-start gap-4 border-2 border-dashed border-seam px-5 py-8">
      <h2 className="text-lg">{title}</h2>
      <div className="grid max-w-prose gap-2">{children}</div>
      {action}
    </section>
  );
}
