'use client';
import { Button } from '@/components/ui/Button';
import type { Cause } from '@/diagnosis/garments/schema';
import type { CauseRow } from '@/diagnosis/reading';
import { ReasonList } from './ReasonList';

interface Props {
  row: CauseRow;
  cause: Cause;
  onRuleOut?: (cause: string) => void;
}

/** Something to look at before any paper is changed. */
export function RankedCause({ row, cause, onRuleOut }: Props) {
  return (
    <li className="grid gap-2 border-l-4 border-basting pl-4">
      <div className="flex flex-wrap items-baseline justify-between gap-x-3">
        <h3 className="font-bold">First: {cause.name}</h3>
        <span className="text-sm text-graphite">{row.word}</span>
      </div>
      <p>{row.action}</p>
      <ReasonList because={row.because} against={row.against} />
      {onRuleOut ? (
        <div>
          <Button
            onClick={() => onRuleOut(row.cause)}
            aria-label={`Looked at, it is not that: ${cause.name}`}
          >
            Looked at, it is not that
          </Button>
        </div>
      ) : null}
    </li>
  );
}
