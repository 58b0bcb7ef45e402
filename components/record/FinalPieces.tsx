'use client';
import { useMemo } from 'react';
import { PIECE_NAMES } from '@/components/pattern/piece-words';
import { PieceFigure } from '@/components/pattern/PieceFigure';
import { Button } from '@/components/ui/Button';
import type { CaseInput } from '@/diagnosis/case-schema';
import { svgDocument } from '@/diagnosis/pattern/svg';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { finalPieces, type FinalPiece } from './final-pieces';
import type { RecordRow } from './record-rows';
import { fileName, saveFile } from './save-file';

interface Props {
  rows: RecordRow[];
  garmentName: string;
  body: CaseInput['body'];
  cloth: CaseInput['cloth'];
  unit: LengthUnit;
}

const LEG_WORDS = { both: '', left: ', your left', right: ', your right' } as const;

/** The pieces as they now are, over what they were drafted as, each to save at full size. */
export function FinalPieces({ rows, garmentName, body, cloth, unit }: Props) {
  const final = useMemo(() => finalPieces(rows, body, cloth), [rows, body, cloth]);
  if (!final.ok) {
    return (
      <p className="max-w-prose">
        “{final.name}” is more than the block that stands in can take, so the pieces are not drawn. The ledger
        above holds every change.
      </p>
    );
  }
  const titleOf = ({ piece, leg }: FinalPiece) => `${PIECE_NAMES[piece]}${LEG_WORDS[leg]}`;
  return (
    <div className="grid gap-4">
      <p className="max-w-prose text-sm text-graphite">
        Drawn on a block drafted to these measures, which stands in for your own pattern. Dashed: as drafted.
        Heavy: what has moved.
      </p>
      <div className="grid gap-6 sm:grid-cols-2 lg:grid-cols-3">
        {final.pieces.map((one) => (
          <figure key={titleOf(one)} className="grid gap-2">
            <PieceFigure drawing={one.drawing} unit={unit} label={`${titleOf(one)}, as drafted and now`} />
            <figcaption className="flex flex-wrap items-center justify-between gap-2">
              <span className="font-bold">{titleOf(one)}</span>
              <Button
                look="quiet"
                className="no-print"
                onClick={() =>
                  saveFile(
                    fileName(`${garmentName} ${titleOf(one)}`, 'svg'),
                    'image/svg+xml',
                    svgDocument(one.drawing, `${garmentName}: ${titleOf(one)}`),
                  )
                }
              >
                Save the {titleOf(one).toLowerCase()} as SVG
              </Button>
            </figcaption>
          </figure>
        ))}
      </div>
    </div>
  );
}
