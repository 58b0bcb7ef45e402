import Link from 'next/link';
import type { ReactNode } from 'react';
import { StudioNav } from './StudioNav';
import { Wordmark } from './Wordmark';

/** What stands round every signed-in page. */
export function StudioFrame({ children }: { children: ReactNode }) {
  return (
    <>
      <a
        href="#main"
        className="sr-only focus:not-sr-only focus:absolute focus:z-30 focus:bg-paper focus:p-3"
      >
        Skip to the page
      </a>
      <header className="no-print mx-auto flex w-full max-w-[100rem] items-center justify-between px-4 py-2 md:px-6">
        <Link href="/journals" aria-label="Ruckle, to the rail" className="inline-flex min-h-11 items-center">
          <Wordmark />
        </Link>
        <StudioNav />
      </header>
      <div className="basted no-print h-0.5" aria-hidden />
      <main id="main" className="mx-auto w-full max-w-[100rem] px-4 pt-5 pb-28 md:px-6 md:pb-16">
        {children}
      </main>
    </>
  );
}
