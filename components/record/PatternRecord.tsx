import { PageHead } from '@/components/ui/PageHead';
import { Section } from '@/components/ui/Section';
import type { DeskDto } from '@/db/queries/desk';
import { bodyOf } from '@/diagnosis/case-from-rounds';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { FinalPieces } from './FinalPieces';
import { RecordActions } from './RecordActions';
import { recordRows, rowsByPiece } from './record-rows';
import { RecordTable } from './RecordTable';

/** The alteration record of one pattern for one person: every change per piece, and the pieces as they now are. */
export function PatternRecord({ desk, unit }: { desk: DeskDto; unit: LengthUnit }) {
  const rows = recordRows(desk);
  const now = desk.rounds.at(-1);
  const by = desk.isOwner ? 'you' : 'whose journal it is';
  return (
    <>
      <PageHead
        title={`${desk.journalName}: the record`}
        lead={`${desk.patternName}, for ${desk.wearerName}`}
        actions={<RecordActions rows={rows} garmentName={desk.journalName} by={by} unit={unit} />}
      />
      <div className="grid gap-10">
        <Section title="Every change, by piece">
          {rows.length === 0 ? (
            <p className="max-w-prose text-graphite">
              No change yet. What you decide after a round is written here, piece by piece.
            </p>
          ) : (
            rowsByPiece(rows).map(({ piece, rows: own }) => (
              <RecordTable key={piece} piece={piece} rows={own} by={by} unit={unit} />
            ))
          )}
        </Section>
        {rows.some(({ isMade }) => isMade) ? (
          <Section title="The pieces now">
            <FinalPieces
              rows={rows}
              garmentName={desk.journalName}
              body={bodyOf(desk.body)}
              cloth={now && { kind: now.clothKind, stretchPercent: now.stretchPercent }}
              unit={unit}
            />
          </Section>
        ) : null}
      </div>
    </>
  );
}
