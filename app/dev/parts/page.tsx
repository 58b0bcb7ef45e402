import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DrawnParts } from '@/components/dev/DrawnParts';
import { PlainParts } from '@/components/dev/PlainParts';
import { PublicFrame } from '@/components/frame/PublicFrame';
import { PageHead } from '@/components/ui/PageHead';
import { env } from '@/lib/env';

export const metadata: Metadata = { title: 'Parts' };

/** Every part of the interface in every state, for whoever works on it; on this machine only. */
export default function PartsPage() {
  if (!env().RUCKLE_LOCAL) notFound();
  return (
    <PublicFrame>
      <PageHead title="Parts" lead="What pages are made of, in all states." />
      <div className="grid gap-10">
        <PlainParts />
        <DrawnParts />
      </div>
    </PublicFrame>
  );
}
