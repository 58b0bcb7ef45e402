import Link from 'next/link';
import type { ReactNode } from 'react';
import { Wordmark } from './Wordmark';

/** One column, one thing to do. */
export function AuthFrame({ children }: { children: ReactNode }) {
  return (
    <main className="mx-auto grid w-full max-w-md content-start gap-8 px-4 py-8">
      <Link
        href="/"
        aria-label="Ruckle, to the beginning"
        className="inline-flex min-h-11 items-center justify-self-start"
      >
        <Wordmark />
      </Link>
      {children}
    </main>
  );
}
