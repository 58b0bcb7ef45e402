import { PIECE_NAMES } from '@/components/pattern/piece-words';
import { amountWithBasis } from '@/components/tape/basis-words';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import type { RecordRow } from './record-rows';

const HEAD = ['round', 'date', 'pieces', 'change', 'side', 'by', 'state', 'amount', 'amount mm', 'in all mm', 'stop in all mm', 'reason']; // prettier-ignore

/** A spreadsheet would run a cell that begins like a formula: an apostrophe makes it words. */
const harmless = (cell: string) => (/^[=+\-@\t\r]/.test(cell) ? `'${cell}` : cell);
const quoted = (cell: string) => `"${harmless(cell).replaceAll('"', '""')}"`;
const mm = (value: number | null) => (value === null ? '' : value.toFixed(2));

/** The record as comma-separated values (RFC 4180: quoted cells, CRLF), one change a line. */
export function recordCsv(rows: readonly RecordRow[], by: string, unit: LengthUnit): string {
  const lines = rows.map((row) => {
    const amountMm = row.isMade ? row.madeMm : row.plannedMm;
    return [
      String(row.round),
      row.date ?? '',
      row.pieces.map((piece) => PIECE_NAMES[piece]).join(' and '),
      row.name,
      row.side,
      by,
      row.isMade ? 'made' : 'planned',
      amountMm === null || !row.of ? '' : amountWithBasis(amountMm, row.of, unit),
      mm(amountMm),
      row.isMade && amountMm !== null ? mm(row.sumMm) : '',
      mm(row.capTotalMm),
      row.reason,
    ];
  });
  return [HEAD, ...lines].map((cells) => `${cells.map(quoted).join(',')}\r\n`).join('');
}
