'use client';
import type { Reading } from '@/diagnosis/reading';

/** On a phone, the top of the reading and the parts of the page within reach of a thumb. */
export function JumpBar({ reading }: { reading: Reading | null }) {
  const first = reading?.ranked[0];
  const row =
    first && reading.corrections.find((one) => one.correction === first.id && one.side === first.side);
  const words = row ? `${row.name}: ${row.word}` : 'The reading';
  return (
    <div className="no-print fixed inset-x-0 bottom-[calc(3.2rem+env(safe-area-inset-bottom))] md:bottom-0 z-10 border-t-2 border-line bg-paper lg:hidden">
      <nav aria-label="Parts of this round" className="flex items-stretch justify-between">
        <a href="#reading" className="flex min-h-11 min-w-0 flex-1 items-center px-4 font-bold">
          <span className="line-clamp-2 leading-tight">{words}</span>
        </a>
        <a
          href="#shows"
          className="flex min-h-11 items-center px-3 text-sm text-chalk underline underline-offset-4"
        >
          Shows
        </a>
        <a
          href="#try"
          className="flex min-h-11 items-center px-3 text-sm text-chalk underline underline-offset-4"
        >
          Try
        </a>
        <a
          href="#plan"
          className="flex min-h-11 items-center px-3 pr-4 text-sm text-chalk underline underline-offset-4"
        >
          Plan
        </a>
      </nav>
    </div>
  );
}
