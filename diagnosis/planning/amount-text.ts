import type { Case } from '../case-schema';
import type { Correction } from '../garments/schema';

const MM_PER_INCH = 25.4;
/** A tape measure's ticks: millimetres, half centimetres' tenths, eighths of an inch. */
const EIGHTHS = 8;

/** An amount in the unit that was asked for, with its sum where it is set in several places: "5 mm on each of 4 edges = 20 mm round". */
export function amountText(amountMm: number, { amounts }: Correction, unit: Case['unit']): string {
  const shown = ticksOf(amountMm, unit);
  const edges =
    amounts?.basis === 'edge' && amounts.conversions.round ? Math.round(1 / amounts.conversions.round) : 1;
  if (edges === 1) return inUnit(shown, unit);
  return `${inUnit(shown, unit)} on each of ${edges} edges = ${inUnit(shown * edges, unit)} round`;
}

/** Whole ticks of a tape, at least one. */
function ticksOf(amountMm: number, unit: Case['unit']): number {
  const ticks = unit === 'in' ? (amountMm / MM_PER_INCH) * EIGHTHS : amountMm;
  return Math.max(1, Math.round(ticks));
}

function inUnit(ticks: number, unit: Case['unit']): string {
  if (unit === 'mm') return `${ticks} mm`;
  if (unit === 'cm') return `${ticks / 10} cm`;
  const whole = Math.floor(ticks / EIGHTHS);
  let [part, of] = [ticks % EIGHTHS, EIGHTHS];
  while (part > 0 && part % 2 === 0) [part, of] = [part / 2, of / 2];
  return `${[whole > 0 || part === 0 ? `${whole}` : '', part > 0 ? `${part}/${of}` : ''].filter(Boolean).join(' ')} in`;
}
