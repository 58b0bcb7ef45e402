import type { ReactNode } from 'react';
import { join } from '@/components/ui/styles';

interface Props {
  number: number;
  date: string | null;
  children: ReactNode;
  isHere?: boolean;
}

/** A round as a swing ticket: the eyelet, the number, the day, and a line on how it hung. */
export function SwingTicket({ number, date, children, isHere }: Props) {
  return (
    <span
      className={join(
        'relative grid gap-0.5 border-2 bg-paper py-2 pr-3 pl-9 [clip-path:polygon(1rem_0,100%_0,100%_100%,1rem_100%,0_calc(100%-1rem),0_1rem)]',
        isHere ? 'border-ink' : 'border-line',
      )}
    >
      <svg
        viewBox="0 0 12 12"
        width="14"
        height="14"
        aria-hidden
        className="absolute top-1/2 left-2.5 -translate-y-1/2 text-line"
      >
        <circle cx="6" cy="6" r="4.5" fill="var(--cloth)" stroke="currentColor" strokeWidth="2" />
      </svg>
      <span className="flex flex-wrap items-baseline gap-x-2">
        <span className="font-bold">Round {number}</span>
        {date ? <span className="text-sm text-graphite">{date}</span> : null}
      </span>
      <span className="text-sm">{children}</span>
    </span>
  );
}
