import type { LengthUnit } from '../units/parse-amount';
import type { MeasureId } from '../measuring/measures';
import { type ChartCell, type Chart, chartOf, middleMm } from './chart';
import { isSizeWord, measureNamed, unitNamed } from './measure-words';
import { readCell } from './parse-cell';
import { readTable } from './read-table';

/** `row` and `column` count from 1 in the pasted table, as a spreadsheet does; `where` says it in words. */
export interface ChartProblem {
  row: number;
  column: number;
  where: string;
  typed: string;
  message: string;
}

export interface ChartPreview {
  chart: Chart;
  problems: ChartProblem[];
  /** How many problems there were beyond those listed. */
  moreProblems: number;
  /** Exactly what was pasted. */
  pasted: string;
}

export const SIZES_MAX = 60;
const PROBLEMS_MAX = 100;
const NAME_MAX = 40;

/** A table turned so that each row is a size, with where each cell stood. */
interface Sheet {
  rows: readonly (readonly string[])[];
  /** Whether sizes stood in columns. */
  isTurned: boolean;
}

const turn = (rows: readonly (readonly string[])[]): string[][] =>
  Array.from({ length: Math.max(0, ...rows.map((row) => row.length)) }, (_, column) =>
    rows.map((row) => row[column] ?? ''),
  );

/** Only the head of a long table is asked where its measures stand. */
const HEAD_ROWS = 60;

function sheetOf(rows: string[][]): Sheet {
  const named = (cells: readonly string[]) => cells.filter((cell) => measureNamed(cell) !== null).length;
  // The corner belongs to neither: it may name a measure, a size or nothing.
  const across = Math.max(0, ...rows.slice(0, 4).map((row) => named(row.slice(1))));
  const down = named(rows.slice(1, HEAD_ROWS).map((row) => row[0] ?? ''));
  return down > across ? { rows: turn(rows), isTurned: true } : { rows, isTurned: false };
}

interface Head {
  row: number;
  columns: { column: number; measure: MeasureId; unit: LengthUnit | null }[];
  nameColumn: number;
  unit: LengthUnit | null;
}

function headOf(rows: Sheet['rows']): Head | null {
  const row = rows.slice(0, 4).findIndex((cells) => cells.some((cell) => measureNamed(cell) !== null));
  const cells = rows[row];
  if (!cells) return null;
  const columns = cells.flatMap((cell, column) => {
    const measure = measureNamed(cell);
    return measure ? [{ column, measure, unit: unitNamed(cell) }] : [];
  });
  const free = cells.findIndex((cell, column) => measureNamed(cell) === null && isSizeWord(cell) && !columns.some((one) => one.column === column)); // prettier-ignore
  const above = rows.slice(0, row + 1).flatMap((one) => one.filter((cell) => measureNamed(cell) === null));
  const units = new Set(above.map(unitNamed).filter((unit) => unit !== null));
  return { row, columns, nameColumn: Math.max(0, free), unit: units.size === 1 ? [...units][0]! : null };
}

/** Collects what could not be read, by cell; the list has an end, its count has none. */
class Problems {
  readonly list: ChartProblem[] = [];
  more = 0;
  constructor(private readonly isTurned: boolean) {}

  add(row: number, column: number, typed: string, message: string, at?: { size: string; measure: string }) {
    if (this.list.length >= PROBLEMS_MAX) {
      this.more += 1;
      return;
    }
    const [r, c] = this.isTurned ? [column + 1, row + 1] : [row + 1, column + 1];
    const named = at && at.size !== '' ? `${at.measure}, size ${at.size} (row ${r}, column ${c})` : null;
    this.list.push({ row: r, column: c, where: named ?? `Row ${r}, column ${c}`, typed, message });
  }
}

function readSizeRow(
  cells: readonly string[],
  row: number,
  head: Head,
  unit: LengthUnit,
  problems: Problems,
): ChartCell[] {
  const size = (cells[head.nameColumn] ?? '').slice(0, NAME_MAX);
  const read = head.columns.flatMap(({ column, measure, unit: own }): ChartCell[] => {
    const typed = cells[column] ?? '';
    const value = readCell(typed, measure, own ?? head.unit ?? unit);
    const at = { size, measure: measure.replaceAll('-', ' ') };
    if (value.kind === 'problem') problems.add(row, column, typed, value.message, at);
    return value.kind === 'value' ? [{ size, measure, typed, ...value.value }] : [];
  });
  cells.forEach((typed, column) => {
    const isKnown = column === head.nameColumn || column < Math.max(...head.columns.map((one) => one.column)) + 1;
    if (typed !== '' && !isKnown) problems.add(row, column, typed, 'No heading stands over this cell.');
  }); // prettier-ignore
  if (size !== '' || read.length === 0) return read;
  problems.add(
    row,
    head.nameColumn,
    '',
    'A size without a name: was this cell merged with another? Name it, or leave the row out.',
  );
  return [];
}

/** A size that stands twice keeps its first cell of each measure. */
function withoutTwins(
  cells: { row: number; cell: ChartCell }[],
  head: Head,
  problems: Problems,
): ChartCell[] {
  const seen = new Set<string>();
  return cells.flatMap(({ row, cell }) => {
    const key = `${cell.size}\n${cell.measure}`;
    if (!seen.has(key)) {
      seen.add(key);
      return [cell];
    }
    const column = head.columns.findLast(({ measure }) => measure === cell.measure)?.column ?? 0;
    problems.add(row, column, cell.typed, 'This size has this measure already; the first one is kept.', cell);
    return [];
  });
}

/** A measure that shrinks while the size grows is named at the cell where it does. */
function shrinking(chart: Chart): ChartCell[] {
  return [...new Set(chart.cells.map(({ measure }) => measure))].flatMap((measure) => {
    const own = chart.sizes.flatMap((size) => chart.cells.filter((cell) => cell.size === size && cell.measure === measure)); // prettier-ignore
    return own.filter((cell, i) => i > 0 && middleMm(cell) < middleMm(own[i - 1]!) - 0.5);
  });
}

/**
 * Reads a size chart as it was typed or pasted. Every cell that could not be read is named with its place; everything else is
 * kept, and the text itself comes back as it was.
 * @param unit the unit that a bare number takes where the table states none
 */
export function parseChart(pasted: string, unit: LengthUnit): ChartPreview {
  const { rows, isTurned } = sheetOf(readTable(pasted));
  const problems = new Problems(isTurned);
  const nothing = (message: string): ChartPreview => {
    problems.add(0, 0, rows[0]?.[0] ?? '', message);
    return { chart: chartOf([]), problems: problems.list, moreProblems: 0, pasted };
  };
  if (rows.length === 0) return nothing('There is nothing in the table yet.');
  const head = headOf(rows);
  if (!head)
    return nothing('No heading names a measure. The first row or column needs words such as waist, hip, thigh or inseam.'); // prettier-ignore
  (rows[head.row] ?? []).forEach((typed, column) => {
    const isKnown = column === head.nameColumn || head.columns.some((one) => one.column === column);
    if (typed !== '' && !isKnown && unitNamed(typed) === null)
      problems.add(head.row, column, typed, 'Ruckle has no measure of this name; it is left out.');
  });
  const found: { row: number; cell: ChartCell }[] = [];
  const names = new Set<string>();
  rows.slice(head.row + 1).forEach((cells, i) => {
    const row = head.row + 1 + i;
    const name = cells[head.nameColumn] ?? '';
    if (names.size >= SIZES_MAX && !names.has(name)) {
      problems.add(row, head.nameColumn, name, `A chart has at most ${SIZES_MAX} sizes; this row is left out.`);
      return;
    }
    const read = readSizeRow(cells, row, head, unit, problems);
    if (read.length > 0) names.add(name);
    found.push(...read.map((cell) => ({ row, cell })));
  }); // prettier-ignore
  const chart = chartOf(withoutTwins(found, head, problems));
  for (const cell of shrinking(chart)) {
    const place = found.find((one) => one.cell === cell);
    const column = head.columns.find(({ measure }) => measure === cell.measure)?.column ?? 0;
    problems.add(place?.row ?? 0, column, cell.typed, 'It is smaller than in the size before, while the size grows. Look whether that is meant.', cell); // prettier-ignore
  }
  return { chart, problems: problems.list, moreProblems: problems.more, pasted };
}
