import 'server-only';
import type { Executor } from '../client';
import { audit } from '../schema/audit';

interface AuditEntry {
  actorId: string | null;
  verb: 'create' | 'update' | 'delete' | 'restore' | 'sign-in' | 'sign-out' | 'grant' | 'revoke';
  objectKind: string;
  objectId: string | null;
  fields?: string[];
}

/** Call it in the transaction of the change it tells of. Field names only, never what was written into them. */
export async function recordAudit(tx: Executor, entry: AuditEntry): Promise<void> {
  await tx.insert(audit).values({ ...entry, fields: entry.fields ?? [] });
}
