import type { CaseInput } from '@/diagnosis/case-schema';
import { drawPiece, type PieceDrawing } from '@/diagnosis/pattern/drawing';
import { replay } from '@/diagnosis/pattern/history';
import { standInBlock } from '@/diagnosis/pattern/stand-in';
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
    for (const piece of PIECES) {
      if (done.block[piece] === block[piece]) continue;
      const drawing = drawPiece(block[piece], done.block[piece], []);
      pieces.push({ leg, piece, drawing: { ...drawing, box: drawing.whole } });
    }
  }
  return { ok: true, pieces };
}
