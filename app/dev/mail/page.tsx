import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { MailList } from '@/components/dev/MailList';
import { PublicFrame } from '@/components/frame/PublicFrame';
import { PageHead } from '@/components/ui/PageHead';
import { listCaughtMail } from '@/lib/mail/caught';

export const metadata: Metadata = { title: 'Caught mail' };
export const dynamic = 'force-dynamic';

export default async function CaughtMailPage() {
  const mails = await listCaughtMail();
  if (!mails) notFound();
  return (
    <PublicFrame>
      <PageHead title="Caught mail" lead="On this machine no letter leaves the house. Newest first." />
      <MailList mails={mails} />
    </PublicFrame>
  );
}
