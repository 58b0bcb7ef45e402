import { useMemo } from 'react';
import type { CaseInput } from '@/diagnosis/case-schema';
import { runChain, type Done } from '@/diagnosis/pattern/chains/run';
import { chainOf } from '@/diagnosis/pattern/chains/trousers';
import { drawPiece, type PieceDrawing } from '@/diagnosis/pattern/drawing';
import { attempt } from '@/diagnosis/pattern/history';
import { standInBlock } from '@/diagnosis/pattern/stand-in';
import { walkSeams, type Walked } from '@/diagnosis/pattern/walk';

export interface PieceChange {
  done: Done;
  drawings: { piece: string; drawing: PieceDrawing }[];
  walked: Walked[];
}

/** The change drawn on the block that stands in, or why it cannot be; null for one that is no drawing. */
export function usePieceChange(
  correction: string,
  amountMm: number,
  body: CaseInput['body'],
  cloth: CaseInput['cloth'],
): PieceChange | string | null {
  const block = useMemo(() => standInBlock(body, cloth), [body, cloth]);
  return useMemo(() => {
    const chain = chainOf(correction);
    if (!chain || amountMm <= 0) return null;
    return attempt(() => {
      const done = runChain(block, chain, amountMm);
      const pieces = [...new Set(chain.map(({ piece }) => piece))];
      const drawings = pieces.map((piece) => ({
        piece,
        drawing: drawPiece(
          done.before[piece],
          done.after[piece],
          done.steps.filter(({ step }) => step.piece === piece).map(({ drawn }) => drawn),
        ),
      }));
      return { done, drawings, walked: walkSeams(done.before, done.after) };
    });
  }, [block, correction, amountMm]);
}
