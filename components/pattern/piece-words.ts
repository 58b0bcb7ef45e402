import type { Side } from '@/diagnosis/case-schema';
import type { DoneStep, Proved } from '@/diagnosis/pattern/chains/run';
import type { Walked } from '@/diagnosis/pattern/walk';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';

export const PIECE_NAMES: Readonly<Record<string, string>> = {
  front: 'Front',
  back: 'Back',
  waistband: 'Waistband',
  yoke: 'Yoke',
  fly: 'Fly',
  pocket: 'Pocket',
};

const EDGE_NAMES: Readonly<Record<string, string>> = {
  centre: 'centre',
  curve: 'curve',
  waist: 'waist',
  side: 'side',
  inseam: 'inseam',
  hem: 'hem',
  upper: 'top edge',
  lower: 'lower edge',
  'dart-1': 'dart',
};
export const edgeName = (edge: string): string => EDGE_NAMES[edge] ?? edge;

/** `+12 mm`, `−3/8 in`. */
export const gainText = (mm: number, unit: LengthUnit): string =>
  `${mm > 0 ? '+' : ''}${amountText(mm, unit)}`;

/** The lines of a step, the amount set in the reader's unit. */
export const stepLines = (lines: readonly string[], amountMm: number, unit: LengthUnit): string[] =>
  lines.map((words) => words.replaceAll('{amount}', amountText(amountMm, unit)));

/** What one measure was and is: "the centre: 27.2 cm before, 28.4 cm after (+12 mm, as it must)". */
export function provedText({ name, declaredMm, beforeMm, afterMm, holds }: Proved, unit: LengthUnit): string {
  const change = afterMm - beforeMm;
  const [before, after] = [amountText(beforeMm, unit), amountText(afterMm, unit)];
  if (!holds) return `${name}: ${before} before, ${after} after. This is not what it should be.`;
  if (declaredMm === 0) return `${name}: ${after}, as before`;
  return `${name}: ${before} before, ${after} after (${gainText(change, unit)})`;
}

/** One pair of seams walked: what the draft meant, and what is out by more than a pattern may be. */
export function walkedText({ id, name, draftedMm, nowMm, verdict }: Walked, unit: LengthUnit): string {
  if (verdict === 'as-drafted') return `${name}: they meet`;
  if (verdict === 'ease') return `${name}: drafted ${amountText(Math.abs(nowMm), unit)} apart, to be eased`;
  const by = amountText(Math.abs(nowMm - draftedMm), unit);
  if (id === 'band') {
    const way = nowMm > draftedMm ? 'longer' : 'shorter';
    return `${name}: make each half of the band ${by} ${way}, shared out along it`;
  }
  return `${name}: now ${by} out. Share it out along the seam, or take it off the longer one.`;
}

/** On which legs the pieces are changed. */
export const legsText = (side: Side): string =>
  side === 'both' ? '' : `Only the pieces of your ${side} leg; mark them so.`;

/** Steps in the order they are done, the pieces that go alike named together. */
export function groupSteps(steps: readonly DoneStep[]): { pieces: string; step: DoneStep }[] {
  const groups: { pieces: string[]; step: DoneStep }[] = [];
  for (const step of steps) {
    const same = groups.find((group) => group.step.step.paper.join() === step.step.paper.join());
    if (same) same.pieces.push(step.step.piece);
    else groups.push({ pieces: [step.step.piece], step });
  }
  return groups.map(({ pieces, step }) => ({
    pieces: pieces.map((piece) => PIECE_NAMES[piece]).join(' and '),
    step,
  }));
}
