import type { BasisOf } from '@/components/tape/basis-words';
import type { DeskDto } from '@/db/queries/desk';
import { bodyOf } from '@/diagnosis/case-from-rounds';
import type { Side } from '@/diagnosis/case-schema';
import { findCorrection } from '@/diagnosis/garments/registry';
import type { Correction } from '@/diagnosis/garments/schema';
import { capsOn } from '@/diagnosis/planning/caps';
import { sizeFactors } from '@/diagnosis/size';

/** One change as it stands in the record. Lengths are mm in the basis of the change. */
export interface RecordRow {
  id: string;
  round: number;
  /** Day that it was made on the paper, or (planned) that the round was worn; null where nobody wrote it down. */
  date: string | null;
  correction: string;
  name: string;
  side: Side;
  pieces: Correction['pieces'];
  of: BasisOf | null;
  plannedMm: number | null;
  /** What was really made; null while it is only planned, or where it is no length. */
  madeMm: number | null;
  isMade: boolean;
  reason: string;
  /** Made of this change so far on that leg, this row included. */
  sumMm: number;
  /** How much of it a pattern may take in all, for this body. */
  capTotalMm: number | null;
}

/** Half a sixteenth of an inch: what the reader's tape cannot show is no excess. */
const TAPE_MM = 25.4 / 32;
export const isPastTotal = ({ isMade, sumMm, capTotalMm }: RecordRow): boolean =>
  isMade && capTotalMm !== null && sumMm > capTotalMm + TAPE_MM;

type Dated = Omit<RecordRow, 'sumMm'>;

/** Made of a change up to a row. What is made on both legs counts on each; for both legs, the leg that has more. */
function sumUpTo(rows: readonly Dated[], at: number): number {
  const { correction, side } = rows[at]!;
  const earlier = rows.slice(0, at + 1).filter((row) => row.isMade && row.correction === correction);
  const onLeg = (leg: Side) =>
    earlier
      .filter((row) => row.side === 'both' || row.side === leg)
      .reduce((total, { madeMm }) => total + (madeMm ?? 0), 0);
  return side === 'both' ? Math.max(onLeg('left'), onLeg('right')) : onLeg(side);
}

const HIP_MM = 1000;

/** Every change of every round in order, with its sum against what a pattern may take; oldest first. */
export function recordRows(desk: DeskDto): RecordRow[] {
  const factors = sizeFactors({ hipMm: HIP_MM, ...bodyOf(desk.body) });
  const rows = desk.rounds.flatMap(({ number, wornOn, changes }) =>
    changes.map((change): Dated => {
      const known = findCorrection(desk.garment, change.correction);
      const caps = known ? capsOn(known, factors) : null;
      const isMade = change.madeAt !== null;
      return {
        id: change.id,
        round: number,
        date: (change.madeAt ?? wornOn)?.slice(0, 10) ?? null,
        correction: known?.id ?? change.correction,
        name: known?.name ?? change.correction,
        side: change.side,
        pieces: known?.pieces ?? [],
        of: known?.amounts ?? null,
        plannedMm: change.plannedMm,
        madeMm: isMade ? (change.madeMm ?? change.plannedMm) : null,
        isMade,
        reason: change.reason,
        capTotalMm: caps?.capTotalMm ?? null,
      };
    }),
  );
  return rows.map((row, at) => ({ ...row, sumMm: sumUpTo(rows, at) }));
}

const PIECES = ['front', 'back', 'waistband', 'yoke', 'fly', 'pocket'] as const;

/** The rows of each piece that was changed; a change of two pieces stands under both. */
export const rowsByPiece = (rows: readonly RecordRow[]): { piece: string; rows: RecordRow[] }[] =>
  PIECES.map((piece) => ({ piece, rows: rows.filter(({ pieces }) => pieces.includes(piece)) })).filter(
    (group) => group.rows.length > 0,
  );
