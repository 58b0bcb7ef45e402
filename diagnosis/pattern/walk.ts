import type { Block } from './blocks/block';
import { read, type Measure } from './measure';
import type { Piece } from './piece';

/** Two seams that are sewn to each other. */
interface SeamPair {
  readonly id: string;
  readonly name: string;
  /** Sum of these on the first and on the second side. */
  readonly first: readonly (readonly [keyof Block, Measure])[];
  readonly second: readonly (readonly [keyof Block, Measure])[];
}

const seam = (from: string, to: string): Measure => ({
  of: 'seam',
  from: { point: from },
  to: { point: to },
});
const edge = (name: string): Measure => ({ of: 'edge', edge: name });

const PAIRS: readonly SeamPair[] = [
  { id: 'inseam-top', name: 'inseam, fork to knee', first: [['front', seam('crotch-point', 'knee-in')]], second: [['back', seam('crotch-point', 'knee-in')]] },
  { id: 'inseam-foot', name: 'inseam, knee to hem', first: [['front', seam('knee-in', 'hem-in')]], second: [['back', seam('knee-in', 'hem-in')]] },
  { id: 'side-foot', name: 'side, hem to knee', first: [['front', seam('hem-out', 'knee-out')]], second: [['back', seam('hem-out', 'knee-out')]] },
  { id: 'side-top', name: 'side, knee to waist', first: [['front', seam('knee-out', 'side-waist')]], second: [['back', seam('knee-out', 'side-waist')]] },
  { id: 'band', name: 'waist and band', first: [['front', edge('waist')], ['back', edge('waist')]], second: [['waistband', edge('lower')]] },
]; // prettier-ignore

/** How much two seams differed as drafted and differ now, mm (+ the first, usually the front, is longer). */
export interface Walked {
  readonly id: string;
  readonly name: string;
  readonly draftedMm: number;
  readonly nowMm: number;
  /** `as-drafted` within 1.5 mm; `ease` where the draft had a difference and still has it; `off` otherwise. */
  readonly verdict: 'as-drafted' | 'ease' | 'off';
}

/** What a seam may be out by before it is named (1/16 in for the strict, standards:S18), mm. */
export const NAMED_OVER_MM = 1.5;

const sumOf = (block: Block, side: SeamPair['first']) =>
  side.reduce((total, [piece, measure]) => total + read(block[piece] as Piece, measure), 0);

/**
 * Walks every pair of seams of the changed pieces against the drafted ones. A drafted difference (a back inseam cut shorter) is
 * kept and shown as ease; whatever else has moved by more than 1.5 mm is named.
 */
export const walkSeams = (drafted: Block, now: Block): Walked[] =>
  PAIRS.map(({ id, name, first, second }) => {
    const difference = (block: Block) => sumOf(block, first) - sumOf(block, second);
    const [draftedMm, nowMm] = [difference(drafted), difference(now)];
    const isOff = Math.abs(nowMm - draftedMm) > NAMED_OVER_MM;
    const verdict = isOff ? 'off' : Math.abs(draftedMm) > NAMED_OVER_MM ? 'ease' : 'as-drafted';
    return { id, name, draftedMm, nowMm, verdict };
  });
