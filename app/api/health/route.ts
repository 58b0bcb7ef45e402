import { isDatabaseUp } from '@/db/queries/health';
import { isStoreUp } from '@/lib/photo-store';
import { answerJson } from '@/lib/request/problem';
import { route } from '@/lib/request/route';

export const GET = route({ access: 'anyone' }, async () => {
  const [database, store] = await Promise.all([isDatabaseUp(), isStoreUp()]);
  const failing = [...(database ? [] : ['database']), ...(store ? [] : ['store'])];
  return failing.length === 0 ? { ok: true } : answerJson({ ok: false, failing }, 503);
});
