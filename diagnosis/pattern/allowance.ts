import { meeting, offsetPoints } from './geometry/outline';
import { angleBetween, minus, type XY } from './geometry/xy';
import type { Piece } from './piece';

/** Nearness of the drawn cutting line to the true offset, mm. */
const WITHIN_MM = 0.02;
/** A corner is mitred no farther out than this many allowances; beyond it is cut off square. */
const MITRE = 4;

/** Runs that meet flatter than this do not make a corner: another allowance then begins with a step. */
const CORNER_DEG = 5;

const farther = (a: XY, b: XY, most: number) => Math.hypot(a.x - b.x, a.y - b.y) > most;

/** Two neighbouring runs joined: mitred at a corner, run together where they meet smoothly. */
function join(run: XY[], next: readonly XY[], most: number): XY[] {
  const [last, first] = [run.at(-1)!, next[0]!];
  if (!farther(last, first, 1e-6)) return [...run, ...next.slice(1)];
  const corner = meeting(run.at(-2)!, last, first, next[1]!);
  const isCorner = angleBetween(minus(last, run.at(-2)!), minus(next[1]!, first)) > CORNER_DEG;
  if (!isCorner || !corner || farther(corner, last, most)) return [...run, ...next];
  return [...run.slice(0, -1), corner, ...next.slice(1)];
}

/** The cutting line: every edge moved outward by its own allowance (mm), corners mitred. Points of a closed line. */
export function cuttingLine(piece: Piece): XY[] {
  const allowance = (edge: string) => piece.allowancesMm[edge] ?? 0;
  const runs = piece.parts.map(({ cubic, edge }) => offsetPoints(cubic, allowance(edge), WITHIN_MM));
  const most = MITRE * Math.max(...piece.parts.map(({ edge }) => allowance(edge)), 1);
  const whole = runs.slice(1).reduce((line, run) => join(line, run, most), [...runs[0]!]);
  const corner = meeting(whole.at(-2)!, whole.at(-1)!, whole[0]!, whole[1]!);
  if (!corner || farther(corner, whole[0]!, most)) return whole;
  return [corner, ...whole.slice(1, -1)];
}
