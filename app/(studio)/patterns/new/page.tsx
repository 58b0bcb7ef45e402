import type { Metadata } from 'next';
import { PatternEditor } from '@/components/patterns/PatternEditor';
import { PageHead } from '@/components/ui/PageHead';
import { requireViewer } from '@/lib/auth/viewer';

export const metadata: Metadata = { title: 'Add a pattern' };

export default async function NewPatternPage() {
  await requireViewer();
  return (
    <>
      <PageHead title="Add a pattern" />
      <PatternEditor />
    </>
  );
}
