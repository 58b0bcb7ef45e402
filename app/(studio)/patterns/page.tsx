import type { Metadata } from 'next';
import { CLOTH_WORDS } from '@/components/patterns/pattern-schema';
import { EmptyState } from '@/components/ui/EmptyState';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { PlainList } from '@/components/ui/PlainList';
import { listPatterns } from '@/db/queries/patterns';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Patterns' };

export default async function PatternsPage() {
  const viewer = await requireViewer();
  const patterns = await listPatterns(viewer);
  const add = <LinkButton href="/patterns/new">Add a pattern</LinkButton>;
  return (
    <>
      <PageHead title="Patterns" lead="The drafts you cut from." actions={patterns.length > 0 && add} />
      {patterns.length === 0 ? (
        <EmptyState title="No pattern yet" action={add}>
          <p>Bought, traced or drafted by you. Keep an unaltered master; Ruckle keeps what you changed.</p>
        </EmptyState>
      ) : (
        <PlainList
          items={patterns.map(({ id, name, maker, clothKind }) => ({
            id,
            href: `/patterns/${id}` as const,
            title: name,
            note: [maker, `for ${CLOTH_WORDS[clothKind].toLowerCase()} cloth`].filter(Boolean).join(' · '),
          }))}
        />
      )}
    </>
  );
}
