'use client';
import { Disclosure } from '@/components/ui/Disclosure';
import type { CaseInput, Side } from '@/diagnosis/case-schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';
import { groupSteps, legsText, PIECE_NAMES, provedText, stepLines, walkedText } from './piece-words';
import { PieceFigure } from './PieceFigure';
import { usePieceChange } from './usePieceChange';

interface Props {
  correction: string;
  name: string;
  amountMm: number;
  side: Side;
  body?: CaseInput['body'];
  cloth?: CaseInput['cloth'];
  unit: LengthUnit;
}

const list = (lines: readonly string[], key: string) => (
  <ul key={key} className="list-disc pl-5 text-sm">
    {lines.map((words) => (
      <li key={words}>{words}</li>
    ))}
  </ul>
);

/** A change drawn to scale on the pieces it concerns, told in steps, every seam measured before and after. */
export function PieceChangeView({ correction, name, amountMm, side, body, cloth, unit }: Props) {
  const change = usePieceChange(correction, amountMm, body, cloth);
  if (change === null) return null;
  if (typeof change === 'string') {
    return (
      <p className="text-sm text-graphite">
        The block that stands in is too small for this amount, or lacks what is changed ({change}). Draw it on
        your own piece.
      </p>
    );
  }
  const { done, drawings, walked } = change;
  const legs = legsText(side);
  return (
    <div className="grid gap-4">
      <p className="text-sm text-graphite">
        A block drafted to these measures stands in for your own pattern: dashed is before, the heavy line is
        what moves.
      </p>
      {drawings.map(({ piece, drawing }) => (
        <figure key={piece} className="grid gap-1">
          <PieceFigure
            drawing={drawing}
            unit={unit}
            label={`${name}: the ${PIECE_NAMES[piece]?.toLowerCase()} before and after, ${amountText(amountMm, unit)}`}
          />
          <figcaption className="text-sm font-bold">{PIECE_NAMES[piece]}</figcaption>
        </figure>
      ))}
      {groupSteps(done.steps).map(({ pieces, step }, index) => (
        <div key={`${pieces} ${index}`} className="grid gap-2">
          <h4 className="font-bold">{pieces}, on paper</h4>
          <ol className="list-decimal pl-5">
            {stepLines(step.step.paper, step.amountMm, unit).map((words) => (
              <li key={words}>{words}</li>
            ))}
          </ol>
          {step.step.muslin ? (
            <>
              <h4 className="font-bold">On the muslin</h4>
              {list(stepLines(step.step.muslin, step.amountMm, unit), 'muslin')}
            </>
          ) : null}
        </div>
      ))}
      {legs ? <p className="font-bold">{legs}</p> : null}
      <Disclosure summary="Every seam, before and after">
        {done.steps.map(({ step, proved }, index) => (
          <div key={`${step.piece} ${index}`}>
            <h4 className="font-bold">{PIECE_NAMES[step.piece]}</h4>
            {list(
              proved.map((one) => provedText(one, unit)),
              'proved',
            )}
          </div>
        ))}
        <h4 className="font-bold">Walked against each other</h4>
        {list(
          walked.map((one) => walkedText(one, unit)),
          'walked',
        )}
      </Disclosure>
    </div>
  );
}
