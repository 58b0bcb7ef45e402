import { amountWithBasis } from '@/components/tape/basis-words';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import type { LedgerRow } from './ledger-rows';

interface Props {
  rows: LedgerRow[];
  unit: LengthUnit;
}

const sideWords = { left: ', your left', right: ', your right', both: '' } as const;

const amountOf = (mm: number | null, row: LedgerRow, unit: LengthUnit) =>
  mm === null || !row.of ? '' : amountWithBasis(mm, row.of, unit);

/** All changes so far: what was decided after which round, how much was planned, how much was really made. */
export function Ledger({ rows, unit }: Props) {
  if (rows.length === 0) {
    return (
      <p className="max-w-prose text-graphite">
        No change yet. What you decide after a round is written here and stays.
      </p>
    );
  }
  return (
    <ol className="grid gap-3">
      {rows.map((row) => (
        <li key={row.id} className="grid gap-x-6 border-l-4 border-seam pl-4 sm:grid-cols-[7rem_1fr]">
          <span className="text-graphite">after round {row.round}</span>
          <span className="grid">
            <span className="font-bold">
              {row.name}
              {sideWords[row.side]}
            </span>
            {row.isMade ? (
              <span>{row.madeMm === null ? 'made' : `made ${amountOf(row.madeMm, row, unit)}`}</span>
            ) : (
              <span className="text-graphite">{`planned ${amountOf(row.plannedMm, row, unit)}`.trim()}</span>
            )}
            {row.isMade && row.plannedMm !== null && row.plannedMm !== row.madeMm ? (
              <span className="text-sm text-graphite">planned {amountOf(row.plannedMm, row, unit)}</span>
            ) : null}
            {row.proposedBy ? <span className="text-sm">proposed by {row.proposedBy}</span> : null}
            {row.reason ? <span className="text-sm">Past the stop mark because: {row.reason}</span> : null}
          </span>
        </li>
      ))}
    </ol>
  );
}
