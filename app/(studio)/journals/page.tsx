import type { Metadata } from 'next';
import Link from 'next/link';
import { Rail } from '@/components/rail/Rail';
import { EmptyState } from '@/components/ui/EmptyState';
import { LinkButton } from '@/components/ui/LinkButton';
import { PageHead } from '@/components/ui/PageHead';
import { listJournals } from '@/db/queries/journals';
import { requireViewer } from '@/lib/auth/viewer';
import { optionalUuid } from '@/lib/request/uuid-or-404';

export const metadata: Metadata = { title: 'The rail' };

export default async function RailPage({ searchParams }: PageProps<'/journals'>) {
  const viewer = await requireViewer();
  const { journals, next } = await listJournals(viewer, optionalUuid((await searchParams).before));
  const begin = (
    <LinkButton href="/journals/new" look="chalk">
      Hang a new garment
    </LinkButton>
  );
  return (
    <>
      <PageHead title="The rail" actions={journals.length > 0 && begin} />
      {journals.length === 0 ? (
        <EmptyState title="The rail is empty" action={begin}>
          <p>
            Sew a muslin, put it on, take a photo. Ruckle helps to read what the cloth says and to change a
            little.
          </p>
        </EmptyState>
      ) : (
        <Rail journals={journals} />
      )}
      {next ? <Link href={`/journals?before=${next}`}>Older garments</Link> : null}
    </>
  );
}
