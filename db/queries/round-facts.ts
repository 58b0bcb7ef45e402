import { sql, type SQL } from 'drizzle-orm';

export type Side = 'left' | 'right' | 'both';
export type Basis = 'round' | 'piece' | 'edge' | 'pinch';

/** `version` is that of the row; `isMine` whether the viewer wrote it. */
export interface SignFact {
  sign: string;
  side: Side;
  severity: number;
  isMine: boolean;
  isOwner: boolean;
  version: number;
}
export interface CheckFact {
  check: string;
  side: Side;
  outcome: string;
  amountMm: number | null;
  amountTyped: string | null;
  basis: Basis | null;
  places: number | null;
  isMine: boolean;
  isOwner: boolean;
  version: number;
}
export interface CauseFact {
  cause: string;
  isPresent: boolean;
  isMine: boolean;
  isOwner: boolean;
  version: number;
}
export interface MeasuredFact {
  id: string;
  label: string;
  terms: { dimension: string; weight: number; side: Side }[];
  needMm: number;
  sdMm: number;
}
export interface ChangeFact {
  id: string;
  correction: string;
  side: Side;
  basis: Basis | null;
  plannedMm: number | null;
  plannedTyped: string | null;
  madeMm: number | null;
  madeTyped: string | null;
  madeAt: string | null;
  reason: string;
  /** Who proposed it, where it was taken from a proposal. */
  proposedBy?: string | null;
  version: number;
}

const list = <T>(fields: SQL, from: SQL): SQL<T[]> =>
  sql<T[]>`(select coalesce(json_agg(json_build_object(${fields})), '[]') from ${from})`;

/** What was found in a round, as JSON lists beside its row: one statement for all rounds of a journal. Selects from rounds joined to journals. */
export const roundFacts = (viewerId: string) => {
  const who = sql`'isMine', f.author_id = ${viewerId}, 'isOwner', f.author_id = journals.owner_id, 'version', f.version`;
  return {
    signs: list<SignFact>(
      sql`'sign', f.sign, 'side', f.side, 'severity', f.severity, ${who}`,
      sql`round_signs f where f.round_id = rounds.id`,
    ),
    checks: list<CheckFact>(
      sql`'check', f."check", 'side', f.side, 'outcome', f.outcome, 'amountMm', f.amount_mm, 'amountTyped', f.amount_typed, 'basis', f.basis, 'places', f.places, ${who}`,
      sql`round_checks f where f.round_id = rounds.id`,
    ),
    causes: list<CauseFact>(
      sql`'cause', f.cause, 'isPresent', f.is_present, ${who}`,
      sql`round_causes f where f.round_id = rounds.id`,
    ),
    measured: list<MeasuredFact>(
      sql`'id', f.id, 'label', f.label, 'terms', f.terms, 'needMm', f.need_mm, 'sdMm', f.sd_mm`,
      sql`round_measured f where f.round_id = rounds.id`,
    ),
    changes: list<ChangeFact>(
      sql`'id', f.id, 'correction', f.correction, 'side', f.side, 'basis', f.basis, 'plannedMm', f.planned_mm, 'plannedTyped', f.planned_typed, 'madeMm', f.made_mm, 'madeTyped', f.made_typed, 'madeAt', f.made_at, 'reason', f.reason, 'proposedBy', f.proposer, 'version', f.version`,
      sql`(select c.*, u.display_name as proposer from changes c left join users u on u.id = c.proposed_by where c.round_id = rounds.id order by c.id) f`,
    ),
  };
};
