import { PIECE_NAMES } from '@/components/pattern/piece-words';
import { amountWithBasis } from '@/components/tape/basis-words';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';
import { isPastTotal, type RecordRow } from './record-rows';

interface Props {
  piece: string;
  rows: RecordRow[];
  by: string;
  unit: LengthUnit;
}

const SIDE_WORDS = { left: 'your left', right: 'your right', both: 'both legs' } as const;
const CELL = 'border-b border-seam px-2 py-2 text-left align-top';

/** "made 12 mm on the piece", "planned 1/2 in on each of 4 edges = 2 in round". */
function amountWords({ isMade, madeMm, plannedMm, of }: RecordRow, unit: LengthUnit): string {
  const mm = isMade ? madeMm : plannedMm;
  const word = isMade ? 'made' : 'planned';
  return mm === null || !of ? word : `${word} ${amountWithBasis(mm, of, unit)}`;
}

function sumWords(row: RecordRow, unit: LengthUnit): string {
  if (!row.isMade || row.capTotalMm === null) return '';
  return `${amountText(row.sumMm, unit)} of ${amountText(row.capTotalMm, unit, 'down')}`;
}

/** Every change of one piece: when, how much, on which legs, whose, and its sum against the stop. */
export function RecordTable({ piece, rows, by, unit }: Props) {
  return (
    <div
      role="region"
      aria-label={`${PIECE_NAMES[piece]}, every change`}
      tabIndex={0}
      className="w-0 min-w-full overflow-x-auto"
    >
      <table className="w-full min-w-[40rem] border-collapse text-sm">
        <caption className="pb-2 text-left text-base font-bold">{PIECE_NAMES[piece]}</caption>
        <thead>
          <tr>
            {['Round', 'Date', 'Change', 'Amount', 'In all, and its stop', 'Whose'].map((head) => (
              <th key={head} scope="col" className={CELL}>
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.id}>
              <td className={CELL}>after {row.round}</td>
              <td className={CELL}>{row.date ? <time dateTime={row.date}>{row.date}</time> : null}</td>
              <th scope="row" className={`${CELL} font-bold`}>
                {row.name}
                <span className="block font-normal text-graphite">{SIDE_WORDS[row.side]}</span>
                {row.reason ? <span className="block font-normal">Because: {row.reason}</span> : null}
              </th>
              <td className={CELL}>{amountWords(row, unit)}</td>
              <td className={CELL}>
                {sumWords(row, unit)}
                {isPastTotal(row) ? <span className="block font-bold text-pin">past the stop</span> : null}
              </td>
              <td className={CELL}>{by}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
