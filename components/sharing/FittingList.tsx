import { EmptyState } from '@/components/ui/EmptyState';
import { PlainList } from '@/components/ui/PlainList';
import { Section } from '@/components/ui/Section';
import type { FittingDto } from '@/db/queries/fittings';

const item = ({ roundId, journalId, journalName, number, ownerName, mayFit }: FittingDto) => ({
  id: roundId,
  href: `/journals/${journalId}/rounds/${number}` as const,
  title: `${ownerName}: ${journalName}, round ${number}`,
  note: mayFit ? 'to look, mark and propose' : 'to look',
});

/** Rounds of others, those that wait for a word first. */
export function FittingList({ fittings }: { fittings: FittingDto[] }) {
  if (fittings.length === 0)
    return (
      <EmptyState title="Nobody has asked for your eye yet">
        <p>When someone opens a journal or a round to your address, it hangs here until they close it.</p>
      </EmptyState>
    );
  const [waiting, rest] = [fittings.filter(({ waits }) => waits), fittings.filter(({ waits }) => !waits)];
  return (
    <>
      {waiting.length > 0 ? (
        <Section title="Asked for your eye">
          <PlainList items={waiting.map(item)} />
        </Section>
      ) : null}
      {rest.length > 0 ? (
        <Section title="You have said something">
          <PlainList items={rest.map(item)} />
        </Section>
      ) : null}
    </>
  );
}
