import Link from 'next/link';
import type { ReactNode } from 'react';
import { LinkButton } from '@/components/ui/LinkButton';
import { Wordmark } from './Wordmark';

/** What stands round the pages that anyone may read. */
export function PublicFrame({ children }: { children: ReactNode }) {
  return (
    <>
      <header className="no-print mx-auto flex w-full max-w-6xl items-center justify-between gap-4 px-4 py-2 md:px-6">
        <Link href="/" aria-label="Ruckle" className="inline-flex min-h-11 items-center">
          <Wordmark />
        </Link>
        <nav aria-label="Account">
          <LinkButton href="/sign-in">Sign in</LinkButton>
        </nav>
      </header>
      <div className="basted h-0.5" aria-hidden />
      <main className="mx-auto w-full max-w-6xl px-4 pt-8 pb-16 md:px-6">{children}</main>
    </>
  );
}
