import type { Basis } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';

export interface BasisOf {
  basis: Basis;
  /** Own-basis millimetres per millimetre of another basis (see the knowledge). */
  conversions: Partial<Record<Basis, number>>;
}

/** On how many edges an amount per edge acts: 0.25 of it per millimetre round is four. */
function edgesOf({ basis, conversions }: BasisOf): number | null {
  if (basis !== 'edge' || !conversions.round) return null;
  const edges = 1 / conversions.round;
  return Math.abs(edges - Math.round(edges)) < 1e-9 ? Math.round(edges) : null;
}

/** The place an amount is of, without the amount: "on each of 4 edges". */
export function basisPlace(of: BasisOf): string {
  const edges = edgesOf(of);
  if (edges === 1) return 'on one edge';
  if (edges !== null) return `on each of ${edges} edges`;
  if (of.basis === 'edge') return 'on that edge';
  if (of.basis === 'round') return 'round';
  if (of.basis === 'pinch') return 'deep, from pin to fold';
  return 'on the piece';
}

/** What the amount comes to round the body: "= 2 in round"; empty where it is no girth. The sum is of the printed amount, so that it adds up. */
export function basisSum(mm: number, of: BasisOf, unit: LengthUnit): string {
  const edges = edgesOf(of);
  if (edges === null || edges === 1) return '';
  return `= ${amountText(mm * edges, unit)} round`;
}

/** Never a number without what it is of: "1/2 in on each of 4 edges = 2 in round". */
export const amountWithBasis = (mm: number, of: BasisOf, unit: LengthUnit): string =>
  [amountText(mm, unit), basisPlace(of), basisSum(mm, of, unit)].filter(Boolean).join(' ');
