import { journalSettling } from '@/components/settling/journal-settling';
import { Settling } from '@/components/settling/Settling';
import { LinkButton } from '@/components/ui/LinkButton';
import { Section } from '@/components/ui/Section';
import type { DeskDto } from '@/db/queries/desk';
import type { JournalDto } from '@/db/queries/journals';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { Ledger } from './Ledger';
import { ledgerRows } from './ledger-rows';
import { RoundTickets } from './RoundTickets';

interface Props {
  journal: JournalDto;
  /** Null until there is a round. */
  desk: DeskDto | null;
  unit: LengthUnit;
}

/** A journal, from its rounds to its ledger. */
export function JournalParts({ journal, desk, unit }: Props) {
  return (
    <div className="grid gap-10">
      <Section title="Rounds">
        <RoundTickets journalId={journal.id} tickets={journal.tickets} />
      </Section>
      <Section title="The settling">
        <Settling {...journalSettling(desk)} />
      </Section>
      <Section title="The ledger">
        <Ledger rows={ledgerRows(journal.garment, desk?.rounds ?? [])} unit={unit} />
        {desk ? (
          <div>
            <LinkButton href={`/journals/${journal.id}/record`}>The record, piece by piece</LinkButton>
          </div>
        ) : null}
      </Section>
    </div>
  );
}
