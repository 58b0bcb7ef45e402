import { type LengthUnit, MM_PER_INCH } from '@/diagnosis/units/parse-amount';

export interface Stops {
  stepMm: number;
  firstMm: number;
  capRoundMm: number;
  capTotalMm: number;
}

const SIXTEENTH_MM = MM_PER_INCH / 16;

/** To the nearest mark of the reader's tape (a millimetre, a sixteenth of an inch), never to nothing: 10 mm is ⅜ in, 12 mm ½ in. */
export const snapMm = (mm: number, unit: LengthUnit): number => {
  const mark = unit === 'cm' ? 1 : SIXTEENTH_MM;
  return Math.max(1, Math.round(mm / mark)) * mark;
};

/** The table's amounts as marks on the reader's tape. The first never passes the stop of a round, nor that the stop in total. */
export function stopsIn(unit: LengthUnit, stops: Stops): Stops {
  const stepMm = snapMm(stops.stepMm, unit);
  const capTotalMm = snapMm(stops.capTotalMm, unit);
  const capRoundMm = Math.min(snapMm(stops.capRoundMm, unit), capTotalMm);
  return { stepMm, capTotalMm, capRoundMm, firstMm: Math.min(snapMm(stops.firstMm, unit), capRoundMm) };
}

export interface TapeTick {
  mm: number;
  /** 0 the shortest … 3 the longest. */
  rank: 0 | 1 | 2 | 3;
  label: string | null;
}

const METRIC: [number, TapeTick['rank']][] = [
  [10, 3],
  [5, 2],
  [1, 0],
];
const INCH: [number, TapeTick['rank']][] = [
  [16, 3],
  [8, 2],
  [4, 1],
  [1, 0],
];

/** Every mark of a tape from 0 to `untilMm`; centimetres or inches carry their number. A long stretch leaves out the finest marks. */
export function tapeTicks(unit: LengthUnit, untilMm: number): TapeTick[] {
  const mark = unit === 'cm' ? 1 : SIXTEENTH_MM;
  const [ranks, whole] = unit === 'cm' ? [METRIC, 10] : [INCH, 16];
  const finest = untilMm / mark > 90 ? (unit === 'cm' ? 5 : 4) : 1;
  const ticks: TapeTick[] = [];
  for (let count = 0; count * mark <= untilMm + 1e-6; count += finest) {
    const rank = ranks.find(([every]) => count % every === 0)?.[1] ?? 0;
    ticks.push({ mm: count * mark, rank, label: count % whole === 0 ? String(count / whole) : null });
  }
  return ticks;
}
