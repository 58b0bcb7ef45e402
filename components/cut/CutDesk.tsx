import { Section } from '@/components/ui/Section';
import { LinkButton } from '@/components/ui/LinkButton';
import type { CutDto } from '@/db/queries/cuts';
import { beforeTheCut } from '@/diagnosis/before-the-cut/before-the-cut';
import { factsOf } from '@/diagnosis/before-the-cut/facts';
import { habitsOf } from '@/diagnosis/before-the-cut/habits';
import { knowledgeOf } from '@/diagnosis/garments/registry';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { ClothSection } from './ClothSection';
import { CutEdits } from './CutEdits';
import { EaseSection } from './EaseSection';
import { FittedForm } from './FittedForm';
import { FlatCheckSection } from './FlatCheckSection';
import { HabitSection } from './HabitSection';
import { SizeSection } from './SizeSection';
import { TakeEvidence } from './TakeEvidence';
import { WaistChoice } from './WaistChoice';

interface Props {
  dto: CutDto;
  unit: LengthUnit;
  isHidden: boolean;
}

/** Everything a tape can tell before the first cut, in the order it is decided. */
export function CutDesk({ dto, unit, isHidden }: Props) {
  const { journalId, choices, patternId, wearerId } = dto;
  const knowledge = knowledgeOf(dto.garment);
  const cut = beforeTheCut(knowledge, factsOf(dto));
  return (
    <CutEdits journalId={journalId} choices={choices}>
      <div className="grid gap-10">
        <Section title="Size">
          <SizeSection cut={cut} unit={unit} isHidden={isHidden} patternId={patternId} wearerId={wearerId} />
        </Section>
        <Section title="Ease">
          <EaseSection rows={cut.ease} ease={choices.ease} unit={unit} />
        </Section>
        <Section title="Cloth">
          <ClothSection gauge={choices.gauge} verdict={cut.cloth} unit={unit} />
        </Section>
        <Section title="Body beside pattern">
          <WaistChoice value={choices.patternWaist} />
          <FlatCheckSection cut={cut} knowledge={knowledge} altered={choices.altered} unit={unit} />
        </Section>
        <Section title="What fitted before">
          <HabitSection habits={habitsOf(dto, cut)} unit={unit} />
        </Section>
        <div className="flex flex-wrap gap-3">
          <LinkButton href={`/journals/${journalId}/cut/sheet`}>Cutting and marking sheet</LinkButton>
          {dto.firstRoundId ? (
            <TakeEvidence journalId={journalId} roundId={dto.firstRoundId} />
          ) : (
            <LinkButton look="chalk" href={`/journals/${journalId}/rounds/new`}>
              Begin round 1
            </LinkButton>
          )}
        </div>
        {dto.isSettled ? (
          <Section title="This one fits">
            <FittedForm journalId={journalId} unit={unit} kept={dto.fittedHere} />
          </Section>
        ) : null}
      </div>
    </CutEdits>
  );
}
