import type { CubicSegment } from './curve';
import type { Sheet } from './mesh';
import type { FigurePoint, Side } from './point';

export type LandmarkName =
  | 'waist-centre' | 'waist' | 'waist-front' | 'waist-back' | 'high-hip' | 'abdomen' | 'hip' | 'seat' | 'under-seat'
  | 'fork' | 'thigh' | 'lap' | 'knee' | 'behind-knee' | 'calf' | 'hem' | 'hem-front' | 'hem-back' | 'ankle'; // prettier-ignore

export type Landmark = {
  /** Unique within a view: the name, and the wearer's side where there are two. */
  readonly id: string;
  readonly name: LandmarkName;
  readonly side: Side | null;
  readonly at: FigurePoint;
};

/** Edges are named in trade words with the wearer's side; together they run once round the garment. */
export type NamedPath = { readonly name: string; readonly segments: readonly CubicSegment[] };

export type Garment = {
  readonly edges: readonly NamedPath[];
  readonly seams: readonly NamedPath[];
  readonly landmarks: readonly Landmark[];
  readonly sheets: readonly Sheet[];
};

export function landmark(name: LandmarkName, side: Side | null, at: FigurePoint): Landmark {
  return { id: side === null ? name : `${name}-${side}`, name, side, at };
}
