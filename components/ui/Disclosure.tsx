import type { ReactNode } from 'react';

/** A line that opens: for what not everyone wants to read at once. */
export function Disclosure({ summary, children }: { summary: ReactNode; children: ReactNode }) {
  return (
    <details className="group">
      <summary className="flex min-h-11 items-center gap-2 text-chalk underline decoration-2 underline-offset-4">
        {summary}
      </summary>
      <div className="grid gap-3 py-2">{children}</div>
    </details>
  );
}
