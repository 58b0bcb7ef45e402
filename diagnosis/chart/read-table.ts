/** What separates the cells of a pasted table; a spreadsheet pastes tabs. Two and more spaces are the last guess. */
const DELIMITERS = ['\t', ';', '|', ','] as const;
const SAMPLE_LINES = 40;

function delimiterOf(lines: readonly string[]): string | null {
  const sample = lines.filter((line) => line.trim() !== '').slice(0, SAMPLE_LINES);
  const found = DELIMITERS.find((one) => {
    const having = sample.filter((line) => line.includes(one)).length;
    return having > 0 && having >= sample.length / 2;
  });
  return found ?? null;
}

/** The end of a quoted cell that begins at `start`, or −1: an inch mark is a quote too, and opens nothing. */
function quoteEnd(text: string, start: number, delimiter: string): number {
  for (let at = start + 1; at < text.length; at += 1) {
    if (text[at] !== '"') continue;
    if (text[at + 1] === '"') {
      at += 1;
      continue;
    }
    const next = text[at + 1];
    return next === undefined || next === delimiter || next === '\n' ? at : -1;
  }
  return -1;
}

function readDelimited(text: string, delimiter: string): string[][] {
  const rows: string[][] = [];
  let row: string[] = [];
  let at = 0;
  while (at <= text.length) {
    let end: number;
    let cell: string;
    const close = text[at] === '"' ? quoteEnd(text, at, delimiter) : -1;
    if (close > 0) {
      cell = text.slice(at + 1, close).replaceAll('""', '"');
      end = close + 1;
    } else {
      const [stop, line] = [text.indexOf(delimiter, at), text.indexOf('\n', at)];
      end = Math.min(stop < 0 ? text.length : stop, line < 0 ? text.length : line);
      cell = text.slice(at, end);
    }
    row.push(cell.trim());
    if (text[end] !== delimiter) {
      rows.push(row);
      row = [];
    }
    at = end + 1;
  }
  return rows;
}

/** A table drawn with bars has empty edges and a ruled line; they are no cells. */
function withoutBars(rows: string[][]): string[][] {
  return rows
    .filter((row) => !row.every((cell) => /^:?-*:?$/.test(cell)) || row.every((cell) => cell === ''))
    .map((row) => {
      const inner = row[0] === '' ? row.slice(1) : row;
      return inner.at(-1) === '' ? inner.slice(0, -1) : inner;
    });
}

/**
 * Reads a table as people paste it: tabs from a spreadsheet, CSV with quotes, semicolons, bars, or columns set with spaces.
 * No cell is dropped but empty lines; the text itself is kept by the caller.
 * @returns rows of trimmed cells, of unequal length where the text was
 */
export function readTable(text: string): string[][] {
  const whole = text.replace(/^\ufeff/, '').replace(/\r\n?/g, '\n');
  const lines = whole.split('\n');
  const delimiter = delimiterOf(lines);
  const rows =
    delimiter === null ? lines.map((line) => line.trim().split(/ {2,}/)) : readDelimited(whole, delimiter);
  const kept = delimiter === '|' ? withoutBars(rows) : rows;
  return kept.filter((row) => row.some((cell) => cell !== ''));
}
