import 'server-only';
import { and, eq, sql, type SQL } from 'drizzle-orm';
import type { Millimetres } from '@/diagnosis/units/millimetres';
import { db, type Executor } from '../client';
import { roundCauses } from '../schema/round-causes';
import { roundChecks } from '../schema/round-checks';
import { roundSigns } from '../schema/round-signs';
import { rounds } from '../schema/rounds';
import { recordAudit } from './audit';
import type { Basis, Side } from './round-facts';
import type { Viewer } from './viewer';
import { roundFittableBy, roundIds } from './visible-to';

/** `seen` is the version the sender last knew, 0 for none. A null state takes the row away: "not looked at". */
interface Seen {
  seen: number;
}
export interface EvidenceInput {
  signs: ({ sign: string; side: Side; severity: number | null } & Seen)[];
  checks: ({
    check: string;
    side: Side;
    outcome: string | null;
    amountMm: Millimetres | null;
    amountTyped: string | null;
    basis: Basis | null;
    places: number | null;
  } & Seen)[];
  causes: ({ cause: string; isPresent: boolean | null } & Seen)[];
}

export interface SavedFact {
  kind: 'sign' | 'check' | 'cause';
  id: string;
  side: Side;
  version: number;
}
export interface EvidenceAnswer {
  saved: SavedFact[];
  /** What was sent against a state that had changed since: what stands there is given back, nothing was overwritten. */
  conflicts: { kind: SavedFact['kind']; id: string; side: Side; theirs: { version: number; says: string } }[];
}

/** The three tables of states are written alike: by key and author, guarded by the version seen. */
interface StateTable {
  table: typeof roundSigns | typeof roundChecks | typeof roundCauses;
  kind: SavedFact['kind'];
}

interface State {
  id: string;
  side: Side;
  seen: number;
  key: SQL | undefined;
  /** The values to write, or null to take the row away. */
  write: { insert: (tx: Executor) => Promise<unknown>; set: Record<string, unknown> } | null;
}

/** What a row says, as the bare value: a severity, an outcome, yes or no. */
function saidIn(row: StateTable['table']['$inferSelect']): string {
  if ('severity' in row) return String(row.severity);
  return 'outcome' in row ? row.outcome : String(row.isPresent);
}

async function saveState(
  tx: Executor,
  { table, kind }: StateTable,
  state: State,
  answer: EvidenceAnswer,
): Promise<void> {
  const { id, side, key, seen, write } = state;
  const [now] = await tx.select().from(table).where(key).for('update');
  if (now && now.version !== seen) {
    answer.conflicts.push({ kind, id, side, theirs: { version: now.version, says: saidIn(now) } });
    return;
  }
  if (!write) {
    if (now) await tx.delete(table).where(key);
    answer.saved.push({ kind, id, side, version: 0 });
    return;
  }
  if (now) {
    await tx
      .update(table)
      .set({ ...write.set, version: sql`${table.version} + 1`, updatedAt: sql`now()` })
      .where(key);
  } else await write.insert(tx);
  answer.saved.push({ kind, id, side, version: (now?.version ?? 0) + 1 });
}

function signState(roundId: string, authorId: string, input: EvidenceInput['signs'][number]): State {
  const { seen, severity, ...named } = input;
  const own = { roundId, authorId, ...named };
  return {
    id: input.sign,
    side: input.side,
    seen,
    key: and(
      eq(roundSigns.roundId, roundId),
      eq(roundSigns.authorId, authorId),
      eq(roundSigns.sign, input.sign),
      eq(roundSigns.side, input.side),
    ),
    write:
      severity === null
        ? null
        : { insert: (tx) => tx.insert(roundSigns).values({ ...own, severity }), set: { severity } },
  };
}

function checkState(roundId: string, authorId: string, input: EvidenceInput['checks'][number]): State {
  const { seen, check, side, outcome, ...amount } = input;
  return {
    id: check,
    side,
    seen,
    key: and(
      eq(roundChecks.roundId, roundId),
      eq(roundChecks.authorId, authorId),
      eq(roundChecks.check, check),
      eq(roundChecks.side, side),
    ),
    write:
      outcome === null
        ? null
        : {
            insert: (tx) =>
              tx.insert(roundChecks).values({ roundId, authorId, check, side, outcome, ...amount }),
            set: { outcome, ...amount },
          },
  };
}

function causeState(roundId: string, authorId: string, input: EvidenceInput['causes'][number]): State {
  const { seen, cause, isPresent } = input;
  return {
    id: cause,
    side: 'both',
    seen,
    key: and(
      eq(roundCauses.roundId, roundId),
      eq(roundCauses.authorId, authorId),
      eq(roundCauses.cause, cause),
    ),
    write:
      isPresent === null
        ? null
        : {
            insert: (tx) => tx.insert(roundCauses).values({ roundId, authorId, cause, isPresent }),
            set: { isPresent },
          },
  };
}

/**
 * Saves what the viewer found in a round, in the viewer's own layer. Each state stands alone: one that has changed since it was
 * seen comes back as a conflict, the others are kept. Null when the round is not one the viewer may fit.
 */
export async function saveEvidence(
  viewer: Viewer,
  roundId: string,
  input: EvidenceInput,
): Promise<EvidenceAnswer | null> {
  return db().transaction(async (tx) => {
    const [allowed] = await tx
      .select({ id: rounds.id })
      .from(rounds)
      .where(and(eq(rounds.id, roundId), sql`${rounds.id} in ${roundIds(roundFittableBy(viewer))}`))
      .for('update');
    if (!allowed) return null;
    const answer: EvidenceAnswer = { saved: [], conflicts: [] };
    const me = viewer.userId;
    for (const sign of input.signs) {
      await saveState(tx, { table: roundSigns, kind: 'sign' }, signState(roundId, me, sign), answer);
    }
    for (const check of input.checks) {
      await saveState(tx, { table: roundChecks, kind: 'check' }, checkState(roundId, me, check), answer);
    }
    for (const cause of input.causes) {
      await saveState(tx, { table: roundCauses, kind: 'cause' }, causeState(roundId, me, cause), answer);
    }
    const fields = [...new Set(answer.saved.map((fact) => fact.kind))];
    if (fields.length > 0) {
      await recordAudit(tx, {
        actorId: me,
        verb: 'update',
        objectKind: 'round-evidence',
        objectId: roundId,
        fields,
      });
    }
    return answer;
  });
}
