import { preferencesSchema } from '@/components/settings/preferences-schema';
import { savePreferences } from '@/db/queries/account';
import { route } from '@/lib/request/route';

export const PATCH = route({ access: 'viewer', body: preferencesSchema }, async ({ viewer, body }) => {
  await savePreferences(viewer, body);
  return { saved: true };
});
