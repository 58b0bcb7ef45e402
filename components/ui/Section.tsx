import { type ReactNode, useId } from 'react';

/** A part of a page under its own heading, set off by a row of basting. */
export function Section({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="basted grid gap-4 pt-4">
      <h2 id={id} className="text-lg">
        {title}
      </h2>
      {children}
    </section>
  );
}
