import type { CaseInput } from '@/diagnosis/case-schema';
import { drawPiece, type PieceDrawing } from '@/diagnosis/pattern/drawing';
import { bandWants, fitBand } from '@/diagnosis/pattern/fit-band';
import { draftFly } from '@/diagnosis/pattern/blocks/fly';
import { replay } from '@/diagnosis/pattern/history';
import { NAMED_OVER_MM } from '@/diagnosis/pattern/walk';
import { standInBlock } from '@/diagnosis/pattern/stand-in';
import type { Piece } from '@/diagnosis/pattern/piece';
import type { RecordRow } from './record-rows';

export interface FinalPiece {
  leg: 'both' | 'left' | 'right';
  piece: string;
  drawing: PieceDrawing;
}

/** What keeps the pieces from being drawn: which change, in the words of its name. */
export type Final = { ok: true; pieces: FinalPiece[] } | { ok: false; name: string };

const PIECES = ['front', 'back', 'waistband'] as const;

/**
 * The pieces after everything that was made, drawn over the block that stands in; the legs apart where a change was made on one
 * of them alone.
 */
export function finalPieces(
  rows: readonly RecordRow[],
  body: CaseInput['body'],
  cloth: CaseInput['cloth'],
): Final {
  const made = rows.filter(({ isMade, madeMm }) => isMade && madeMm !== null && madeMm > 0);
  const isSided = made.some(({ side }) => side !== 'both');
  const block = standInBlock(body, cloth);
  const pieces: FinalPiece[] = [];
  for (const leg of isSided ? (['left', 'right'] as const) : (['both'] as const)) {
    const own = made.filter(({ side }) => side === 'both' || side === leg);
    const done = replay(
      block,
      own.map(({ correction, madeMm }) => ({ correction, amountMm: madeMm! })),
    );
    if (!done.ok) return { ok: false, name: own[done.at]!.name };
    const isBandOff = Math.abs(bandWants(block, done.block)) > NAMED_OVER_MM;
    const now = isBandOff ? fitBand(block, done.block) : done.block;
    const add = (piece: string, before: Piece, after: Piece) => {
      const drawing = drawPiece(before, after, []);
      pieces.push({ leg, piece, drawing: { ...drawing, box: drawing.whole } });
    };
    for (const piece of PIECES) if (now[piece] !== block[piece]) add(piece, block[piece], now[piece]);
    if (own.some((row) => row.pieces.includes('fly'))) add('fly', draftFly(block.front), draftFly(now.front));
  }
  return { ok: true, pieces };
}
