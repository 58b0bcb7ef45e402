import { type ReactNode, useId } from 'react';

interface Props {
  title: string;
  /** An address on the page, for links to it. */
  id?: string;
  children: ReactNode;
}

/** A part of a page under its own heading, set off by a row of basting. */
export function Section({ title, id, children }: Props) {
  const own = useId();
  return (
    <section id={id} aria-labelledby={own} className="basted grid scroll-mt-4 content-start gap-4 pt-4">
      <h2 id={own} className="text-lg">
        {title}
      </h2>
      {children}
    </section>
  );
}
