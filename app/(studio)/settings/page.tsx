import type { Metadata } from 'next';
import { AccountLinks } from '@/components/settings/AccountLinks';
import { SignOut } from '@/components/settings/SignOut';
import { PreferencesEditor } from '@/components/settings/PreferencesEditor';
import { PageHead } from '@/components/ui/PageHead';
import { Section } from '@/components/ui/Section';
import { requireViewer } from '@/lib/auth/viewer';
import { signOut } from './actions';

export const metadata: Metadata = { title: 'Settings' };

export default async function SettingsPage() {
  const viewer = await requireViewer();
  const { displayName, unit, words, hidesMeasurements, isFitter, isPatternMaker } = viewer;
  return (
    <>
      <PageHead title="Settings" />
      <div className="grid gap-10">
        <PreferencesEditor
          preferences={{ displayName, unit, words, hidesMeasurements, isFitter, isPatternMaker }}
        />
        <Section title="Signed in">
          <p>as {viewer.email}</p>
          <AccountLinks isAdmin={viewer.isAdmin} />
          <SignOut userId={viewer.userId} action={signOut} />
        </Section>
      </div>
    </>
  );
}
