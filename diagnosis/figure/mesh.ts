import type { Zone } from '../garments/schema';
import type { FigurePoint, Side } from './point';

export type ZoneRegion = {
  readonly zone: Zone;
  /** The wearer's side; null where the zone crosses the centre line. */
  readonly side: Side | null;
  readonly polygon: readonly FigurePoint[];
};

/** The row of a garment at a level: where a fraction (0–1) across it lies. */
export type RowReader = (v: number) => (fraction: number) => FigurePoint;

/**
 * A sheet of cloth as rows (levels down the garment) and columns (centre or inseam to side seam, or front to back), and
 * which zone each cell belongs to. Zones are unions of cells of one mesh, so they tile by construction.
 */
export type Sheet = {
  readonly side: Side;
  /** Levels between the row bands, rising. */
  readonly rows: readonly number[];
  /** Fractions 0–1 between the column bands at a level, rising, first 0, last 1. */
  readonly columnsAt: (v: number) => readonly number[];
  readonly rowAt: RowReader;
  /** Zone of each row band and column band. */
  readonly zones: readonly (readonly Zone[])[];
  /** Rows down to this level share their first column with the other sheet (the centre line). */
  readonly joinedDownTo: number | null;
  readonly isSided: (zone: Zone) => boolean;
};

const ROW_STEP_MAX = 0.07;
const COLUMN_PARTS = 3;

type Cell = { readonly region: string; readonly corners: readonly [string, string, string, string] };
type Mesh = { readonly points: Map<string, FigurePoint>; readonly cells: Cell[] };

function subdivide(breaks: readonly number[], partsOf: (from: number, to: number) => number) {
  const values: { value: number; band: number; share: number }[] = [];
  for (let band = 0; band + 1 < breaks.length; band += 1) {
    const [from, to] = [breaks[band]!, breaks[band + 1]!];
    const parts = partsOf(from, to);
    for (let part = 0; part < parts; part += 1) {
      values.push({ value: from + ((to - from) * part) / parts, band, share: part / parts });
    }
  }
  values.push({ value: breaks.at(-1)!, band: breaks.length - 2, share: 1 });
  return values;
}

function addSheet(mesh: Mesh, sheet: Sheet): void {
  const rows = subdivide(sheet.rows, (from, to) => Math.ceil((to - from) / ROW_STEP_MAX - 1e-9));
  const columns = subdivide(sheet.columnsAt(0), () => COLUMN_PARTS);
  const nameOf = (row: number, column: number) => {
    const isShared = column === 0 && sheet.joinedDownTo !== null && rows[row]!.value <= sheet.joinedDownTo;
    return `${isShared ? 'centre' : sheet.side}:${row}:${column}`;
  };
  rows.forEach(({ value: v }, row) => {
    const breaks = sheet.columnsAt(v);
    const at = sheet.rowAt(v);
    columns.forEach(({ band, share }, column) => {
      const fraction = breaks[band]! + (breaks[band + 1]! - breaks[band]!) * share;
      mesh.points.set(nameOf(row, column), at(fraction));
    });
  });
  for (let row = 0; row + 1 < rows.length; row += 1) {
    for (let column = 0; column + 1 < columns.length; column += 1) {
      const zone = sheet.zones[rows[row]!.band]![columns[column]!.band]!;
      const ring = [
        nameOf(row, column),
        nameOf(row, column + 1),
        nameOf(row + 1, column + 1),
        nameOf(row + 1, column),
      ] as const;
      const corners = sheet.side === 'left' ? ring : ([ring[0], ring[3], ring[2], ring[1]] as const);
      mesh.cells.push({ region: `${zone}|${sheet.isSided(zone) ? sheet.side : ''}`, corners });
    }
  }
}

/** The boundary of a connected set of cells: edges walked in both directions cancel, the rest chain to a ring. */
function traceBoundary(cells: readonly Cell[], points: Map<string, FigurePoint>): FigurePoint[] {
  const edges = new Map<string, { from: string; to: string }>();
  for (const { corners } of cells) {
    corners.forEach((from, index) => {
      const to = corners[(index + 1) % 4]!;
      if (!edges.delete(`${to}>${from}`)) edges.set(`${from}>${to}`, { from, to });
    });
  }
  const next = new Map([...edges.values()].map(({ from, to }) => [from, to]));
  const start = edges.values().next().value!.from;
  const ring: FigurePoint[] = [];
  let at = start;
  do {
    ring.push(points.get(at)!);
    at = next.get(at)!;
  } while (at !== start);
  if (ring.length !== edges.size) throw new Error('A zone of the figure is in pieces: its table is wrong.');
  return ring;
}

/** The zones of the sheets, and the outline of all of them together, sampled at the same points. */
export function buildZones(sheets: readonly Sheet[]): { zones: ZoneRegion[]; outline: FigurePoint[] } {
  const mesh: Mesh = { points: new Map(), cells: [] };
  for (const sheet of sheets) addSheet(mesh, sheet);
  const byRegion = new Map<string, Cell[]>();
  for (const cell of mesh.cells) {
    const cells = byRegion.get(cell.region);
    if (cells) cells.push(cell);
    else byRegion.set(cell.region, [cell]);
  }
  const zones = [...byRegion].map(([region, cells]): ZoneRegion => {
    const [zone, side] = region.split('|') as [Zone, Side | ''];
    return { zone, side: side === '' ? null : side, polygon: traceBoundary(cells, mesh.points) };
  });
  return { zones, outline: traceBoundary(mesh.cells, mesh.points) };
}
