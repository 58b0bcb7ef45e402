import { Section } from '@/components/ui/Section';
import type { CutDto } from '@/db/queries/cuts';
import { beforeTheCut } from '@/diagnosis/before-the-cut/before-the-cut';
import { factsOf } from '@/diagnosis/before-the-cut/facts';
import { cuttingSheet, PART_WORDS, SHEET_PARTS } from '@/diagnosis/cutting/sheet';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import { sizeWords } from '@/diagnosis/sizing/levels';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { BlendList } from './BlendList';
import { CutEdits } from './CutEdits';
import { ListTick } from './ListTick';
import { SheetAlterations } from './SheetAlterations';
import { SheetChoices } from './SheetChoices';

/** The cutting and marking sheet of this pattern for this person: to print, or to tick off beside the table. */
export function CuttingSheet({ dto, unit }: { dto: CutDto; unit: LengthUnit }) {
  const { choices, journalId, clothKind } = dto;
  const cut = beforeTheCut(knowledgeOf(dto.garment), factsOf(dto));
  const lines = cuttingSheet({ cloth: clothKind, cut: choices.cut, isNarrowLeg: choices.isNarrowLeg });
  const { base } = cut.sizes;
  return (
    <CutEdits journalId={journalId} choices={choices}>
      <div className="grid gap-8">
        <SheetChoices cut={choices.cut} isNarrowLeg={choices.isNarrowLeg} />
        <Section title="This one">
          <p>{base ? `Cut size ${sizeWords(base)}.` : 'No size is chosen yet.'}</p>
          <BlendList blends={cut.blends} unit={unit} />
          <SheetAlterations differences={cut.differences} unit={unit} />
        </Section>
        {SHEET_PARTS.map((part) => (
          <Section key={part} title={PART_WORDS[part]}>
            <ul className="grid max-w-3xl">
              {lines
                .filter((line) => line.part === part)
                .map(({ id, text, why }) => (
                  <li key={id} className="break-inside-avoid">
                    <ListTick
                      list="ticked"
                      id={id}
                      isOn={choices.ticked.includes(id)}
                      label={
                        <>
                          {text}
                          {why ? <span className="block text-sm text-graphite">{why}</span> : null}
                        </>
                      }
                    />
                  </li>
                ))}
            </ul>
          </Section>
        ))}
      </div>
    </CutEdits>
  );
}
