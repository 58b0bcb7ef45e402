import type { Case, RoundEvidence, Side } from '../case-schema';
import type { Direction } from '../garments/schema';
import { tailsOf } from '../inference/beliefs';
import { GRID_SIZE, zAt } from '../inference/grid';
import type { Layout } from '../inference/layout';
import type { Range } from '../reading';

/** Beliefs of a case in the terms that planning needs. */
export interface Outlook {
  layout: Layout;
  marginals: readonly Float64Array[];
  fitting: Case;
  /** Whether anything at all was recorded, in any round. */
  evidence: boolean;
  /** Neither a check nor a measurement: nothing is more than possible, no amount above the first. */
  marksAlone: boolean;
}

/** Looks at the beliefs of a case. */
export function outlookOf(layout: Layout, fitting: Case, marginals: readonly Float64Array[]): Outlook {
  const rounds: RoundEvidence[] = [fitting, ...fitting.history];
  const firm = rounds.some(({ tests, measured }) => tests.length + measured.length > 0);
  const noted = rounds.some(({ signs, absent }) => signs.length + absent.length > 0);
  return { layout, marginals, fitting, evidence: firm || noted, marksAlone: !firm };
}

/** A need in one direction: how probable, and how large if so, in millimetres of its own basis (unsigned). */
export interface Tail {
  dimension: number;
  variable: number;
  side: Side;
  direction: Direction;
  probability: number;
  meanMm: number;
  /** Middle four fifths, unsigned, small end first. */
  rangeMm: Range;
}

/** Both directions of every need. */
export function tailsIn({ layout, marginals }: Outlook): Tail[] {
  return layout.variables.flatMap((variable, at) =>
    variable.kind === 'cause'
      ? []
      : (['more', 'less'] as const).map((direction) => tailAt(layout, marginals, at, direction)),
  );
}

/** One direction of the need at a variable. */
export function tailAt(
  layout: Layout,
  marginals: readonly Float64Array[],
  at: number,
  direction: Direction,
): Tail {
  const variable = layout.variables[at]!;
  if (variable.kind === 'cause') throw new Error('A cause has no directions');
  const { dimension, side } = variable;
  const belief = marginals[at]!;
  const probability = tailsOf(layout, dimension, belief)[direction];
  const scaleMm = layout.scaleMm[dimension]!;
  const { mean, low, high } = spreadOf(belief, direction, layout.toleranceMm[dimension]! / scaleMm);
  return {
    dimension,
    variable: at,
    side,
    direction,
    probability,
    meanMm: mean * scaleMm,
    rangeMm: [low * scaleMm, high * scaleMm],
  };
}

/** Mean and middle four fifths of |z| beyond an edge, on one side. */
function spreadOf(belief: Float64Array, direction: Direction, edge: number) {
  const outward = Array.from({ length: GRID_SIZE }, (_, bin) => bin)
    .map((bin) => ({ z: direction === 'more' ? zAt(bin) : -zAt(bin), weight: belief[bin]! }))
    .filter(({ z }) => z > edge + 1e-9)
    .sort((a, b) => a.z - b.z);
  const total = outward.reduce((sum, { weight }) => sum + weight, 0);
  if (!(total > 0)) return { mean: edge, low: edge, high: edge };
  const quantile = (share: number) => {
    let sum = 0;
    return outward.find(({ weight }) => (sum += weight) >= share * total * (1 - 1e-12))?.z ?? edge;
  };
  return {
    mean: outward.reduce((sum, { z, weight }) => sum + z * weight, 0) / total,
    low: quantile(0.1),
    high: quantile(0.9),
  };
}
