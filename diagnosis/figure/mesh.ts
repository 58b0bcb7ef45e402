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

type Corners = readonly [number, number, number, number];
type Cell = { readonly region: string; readonly corners: Corners };
/** Corners are places in `points`; `centre` holds those of the centre line by row, which both sheets share. */
type Mesh = { readonly points: FigurePoint[]; readonly centre: Map<number, number>; readonly cells: Cell[] };

/** A value along the bands: in which band it lies and how far into it. */
type Division = { readonly value: number; readonly band: number; readonly share: number };

function subdivide(breaks: readonly number[], partsOf: (from: number, to: number) => number): Division[] {
  const values: Division[] = [];
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

/** Adds the sheet's points, row by row; says which point stands at each row and column. */
function addPoints(
  mesh: Mesh,
  sheet: Sheet,
  rows: readonly Division[],
  columns: readonly Division[],
): number[][] {
  return rows.map(({ value: v }, row) => {
    const breaks = sheet.columnsAt(v);
    const at = sheet.rowAt(v);
    return columns.map(({ band, share }, column) => {
      const isShared = column === 0 && sheet.joinedDownTo !== null && v <= sheet.joinedDownTo;
      const known = isShared ? mesh.centre.get(row) : undefined;
      if (known !== undefined) return known;
      const place = mesh.points.push(at(breaks[band]! + (breaks[band + 1]! - breaks[band]!) * share)) - 1;
      if (isShared) mesh.centre.set(row, place);
      return place;
    });
  });
}

function addSheet(mesh: Mesh, sheet: Sheet): void {
  const rows = subdivide(sheet.rows, (from, to) => Math.ceil((to - from) / ROW_STEP_MAX - 1e-9));
  const columns = subdivide(sheet.columnsAt(0), () => COLUMN_PARTS);
  const places = addPoints(mesh, sheet, rows, columns);
  for (let row = 0; row + 1 < rows.length; row += 1) {
    for (let column = 0; column + 1 < columns.length; column += 1) {
      const zone = sheet.zones[rows[row]!.band]![columns[column]!.band]!;
      const [upper, lower] = [places[row]!, places[row + 1]!];
      const [a, b, c, d] = [upper[column]!, upper[column + 1]!, lower[column + 1]!, lower[column]!];
      const corners: Corners = sheet.side === 'left' ? [a, b, c, d] : [a, d, c, b];
      mesh.cells.push({ region: `${zone}|${sheet.isSided(zone) ? sheet.side : ''}`, corners });
    }
  }
}

/** The boundary of a connected set of cells: edges walked in both directions cancel, the rest chain to a ring. */
function traceBoundary(cells: readonly Cell[], points: readonly FigurePoint[]): FigurePoint[] {
  const count = points.length;
  const edges = new Set<number>();
  for (const { corners } of cells) {
    corners.forEach((from, index) => {
      const to = corners[(index + 1) % 4]!;
      if (!edges.delete(to * count + from)) edges.add(from * count + to);
    });
  }
  const next = new Map([...edges].map((edge) => [Math.floor(edge / count), edge % count]));
  const [start] = next.keys();
  const ring: FigurePoint[] = [];
  let at = start!;
  do {
    ring.push(points[at]!);
    at = next.get(at)!;
  } while (at !== start);
  if (ring.length !== edges.size) throw new Error('A zone of the figure is in pieces: its table is wrong.');
  return ring;
}

/** The zones of the sheets, and the outline of all of them together, sampled at the same points. */
export function buildZones(sheets: readonly Sheet[]): { zones: ZoneRegion[]; outline: FigurePoint[] } {
  const mesh: Mesh = { points: [], centre: new Map(), cells: [] };
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
