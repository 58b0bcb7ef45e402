import type { Block } from '../blocks/block';
import { read } from '../measure';
import type { Declared, Drawn } from '../operators/outcome';
import type { Piece } from '../piece';
import { trueAll } from '../truing';
import type { Chain, ChainStep } from './chain';

/** What was declared of one measure, and what the geometry did. All mm. */
export interface Proved {
  readonly name: string;
  readonly declaredMm: number;
  readonly beforeMm: number;
  readonly afterMm: number;
  readonly holds: boolean;
}

/** A step done: proved as the operator left it, then trued. */
export interface DoneStep {
  readonly step: ChainStep;
  readonly amountMm: number;
  readonly before: Piece;
  readonly after: Piece;
  readonly drawn: Drawn;
  readonly proved: readonly Proved[];
}

export interface Done {
  readonly before: Block;
  readonly after: Block;
  readonly steps: readonly DoneStep[];
}

const prove = (before: Piece, after: Piece, { name, measure, byMm, withinMm }: Declared): Proved => {
  const [beforeMm, afterMm] = [read(before, measure), read(after, measure)];
  const holds = Math.abs(afterMm - beforeMm - byMm) <= withinMm;
  return { name, declaredMm: byMm, beforeMm, afterMm, holds };
};

function doStep(piece: Piece, step: ChainStep, amountMm: number): DoneStep {
  const { before, piece: changed, drawn, declared } = step.run(piece, amountMm);
  return {
    step,
    amountMm,
    before: piece,
    after: trueAll(changed),
    drawn,
    proved: declared.map((one) => prove(before, changed, one)),
  };
}

/** A correction done on the block by the amount (mm, in the basis of the correction), each step proved. @throws RangeError when the piece is too small for it. */
export function runChain(block: Block, chain: Chain, amountMm: number): Done {
  let after = block;
  const steps = chain.map((step) => {
    const done = doStep(after[step.piece], step, amountMm * step.perMm);
    after = { ...after, [step.piece]: done.after };
    return done;
  });
  return { before: block, after, steps };
}
