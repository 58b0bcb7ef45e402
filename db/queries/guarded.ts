import 'server-only';
import { db, type Executor } from '../client';
import { recordAudit } from './audit';
import { done, missing, type Written } from './outcome';
import type { Viewer } from './viewer';

interface GuardedWrite<Row, Edit extends object> {
  viewer: Viewer;
  objectKind: string;
  id: string;
  /** What the person wanted; its field names go into the audit, and it comes back with a conflict. */
  edit: Edit;
  /** The update, with permission and seen version in its WHERE. Whether a row was written. */
  write: (tx: Executor) => Promise<boolean>;
  /** The row as the viewer may see it now; null where there is none for them. */
  find: () => Promise<Row | null>;
}

/**
 * A write that only succeeds on the version that was seen. A lost race gives back both versions; a row that is not the viewer's
 * and one that is not there are the same.
 */
export async function writeGuarded<Row, Edit extends object>({
  viewer,
  objectKind,
  id,
  edit,
  write,
  find,
}: GuardedWrite<Row, Edit>): Promise<Written<Row>> {
  const isWritten = await db().transaction(async (tx) => {
    if (!(await write(tx))) return false;
    const fields = Object.keys(edit);
    await recordAudit(tx, { actorId: viewer.userId, verb: 'update', objectKind, objectId: id, fields });
    return true;
  });
  const now = await find();
  if (!now) return missing();
  return isWritten ? done(now) : { kind: 'conflict', mine: edit, theirs: now };
}
