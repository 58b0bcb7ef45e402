import type { DeskRoundDto } from '@/db/queries/desk';
import type { Basis } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import type { EvidenceForm } from './round-schema';

export type Side = 'left' | 'right' | 'both';

export interface CheckAnswer {
  outcome: string;
  amount: { typed: string; unit: LengthUnit } | null;
  amountMm: number | null;
  basis: Basis | null;
  places: number | null;
}

/** One thing the person said, or took back (null); `version` is the one that the server has, 0 for none. */
export type Entry = { id: string; side: Side; version: number; editedAt: number; isContested?: boolean } & (
  | { kind: 'sign'; value: number | null }
  | { kind: 'check'; value: CheckAnswer | null }
  | { kind: 'cause'; value: boolean | null }
);
export type Edit = Pick<Entry, 'id' | 'side'> & (
  | { kind: 'sign'; value: number | null }
  | { kind: 'check'; value: CheckAnswer | null }
  | { kind: 'cause'; value: boolean | null }
); // prettier-ignore

/** The viewer's own layer of a round by key. An entry is dirty while `editedAt` is above 0: the server has not
 * acknowledged it. A contested one was changed elsewhere meanwhile and waits for the person to choose. */
export interface EvidenceState {
  entries: Record<string, Entry>;
  edits: number;
}

export const entryKey = ({ kind, id, side }: Pick<Entry, 'kind' | 'id' | 'side'>) => `${kind} ${id} ${side}`;

const fresh = (version: number) => ({ version, editedAt: 0 });

/** @param unit that a typed amount's bare number took; the length itself comes from the server in mm */
export function evidenceFrom(round: DeskRoundDto, unit: LengthUnit): EvidenceState {
  const entries: Entry[] = [
    ...round.signs
      .filter(({ isMine }) => isMine)
      .map(({ sign, side, severity, version }) => ({
        kind: 'sign' as const,
        id: sign,
        side,
        value: severity,
        ...fresh(version),
      })),
    ...round.checks
      .filter(({ isMine }) => isMine)
      .map(({ check, side, outcome, amountMm, amountTyped, basis, places, version }) => ({
        kind: 'check' as const,
        id: check,
        side,
        value: {
          outcome,
          amount: amountTyped === null ? null : { typed: amountTyped, unit },
          amountMm,
          basis,
          places,
        },
        ...fresh(version),
      })),
    ...round.causes
      .filter(({ isMine }) => isMine)
      .map(({ cause, isPresent, version }) => ({
        kind: 'cause' as const,
        id: cause,
        side: 'both' as const,
        value: isPresent,
        ...fresh(version),
      })),
  ];
  return { entries: Object.fromEntries(entries.map((entry) => [entryKey(entry), entry])), edits: 0 };
}

export function applyEdits(state: EvidenceState, edits: Edit[]): EvidenceState {
  const entries = { ...state.entries };
  const editedAt = state.edits + 1;
  for (const edit of edits) {
    const key = entryKey(edit);
    entries[key] = { ...edit, version: entries[key]?.version ?? 0, editedAt };
  }
  return { entries, edits: editedAt };
}

export const dirtyEntries = (state: EvidenceState): Entry[] =>
  Object.values(state.entries).filter(({ editedAt }) => editedAt > 0);
export const contestedEntries = (state: EvidenceState): Entry[] =>
  Object.values(state.entries).filter(({ isContested }) => isContested);

/** Drafts of an earlier visit that never reached the server, laid over what came with the page; words said since then stay. */
export const withDrafts = (state: EvidenceState, drafts: Entry[]): EvidenceState =>
  applyEdits(
    state,
    drafts.filter((draft) => !((state.entries[entryKey(draft)]?.editedAt ?? 0) > 0)).map(editOf),
  );

/** The bare edit of an entry, without what the server knows of it. */
export function editOf(entry: Entry): Edit {
  const { id, side } = entry;
  if (entry.kind === 'sign') return { kind: 'sign', id, side, value: entry.value };
  if (entry.kind === 'cause') return { kind: 'cause', id, side, value: entry.value };
  return { kind: 'check', id, side, value: entry.value };
}

/** What is sent: each entry with the version that the server has of it. */
export function formOf(entries: Entry[]): EvidenceForm {
  const form: EvidenceForm = { signs: [], checks: [], causes: [] };
  for (const entry of entries) {
    const { id, side, version: seen } = entry;
    if (entry.kind === 'sign') form.signs.push({ sign: id, side, severity: entry.value, seen });
    else if (entry.kind === 'cause') form.causes.push({ cause: id, isPresent: entry.value, seen });
    else {
      const { outcome = null, amount = null, basis = null, places = null } = entry.value ?? {};
      form.checks.push({ check: id, side, outcome, amount, basis, places, seen });
    }
  }
  return form;
}

export interface Acknowledged {
  saved: (Pick<Entry, 'kind' | 'id' | 'side'> & { version: number })[];
  conflicts: (Pick<Entry, 'kind' | 'id' | 'side'> & { theirs: { version: number; says: string } })[];
}

/**
 * Takes in the answer to what was sent when `edits` stood at `sentAt`. An entry edited again since stays dirty. A conflict keeps
 * the person's own word with the newer version number, contested: it is sent again only when they choose it.
 */
export function acknowledge(state: EvidenceState, sentAt: number, answer: Acknowledged): EvidenceState {
  const entries = { ...state.entries };
  for (const fact of answer.saved) {
    const entry = entries[entryKey(fact)];
    if (!entry) continue;
    entries[entryKey(fact)] = {
      ...entry,
      version: fact.version,
      editedAt: entry.editedAt > sentAt ? entry.editedAt : 0,
    };
  }
  for (const fact of answer.conflicts) {
    const entry = entries[entryKey(fact)];
    if (entry) entries[entryKey(fact)] = { ...entry, version: fact.theirs.version, isContested: true };
  }
  return { ...state, entries };
}

/** The round as the reading takes it: the viewer's layer as it stands here, and what others found as it came with the page. */
export function roundWithEvidence(round: DeskRoundDto, state: EvidenceState, isOwner: boolean): DeskRoundDto {
  const others = <T extends { isMine: boolean }>(facts: T[]) => facts.filter(({ isMine }) => !isMine);
  const next = { signs: others(round.signs), checks: others(round.checks), causes: others(round.causes) };
  for (const { kind, id, side, value, version } of Object.values(state.entries)) {
    if (value === null) continue;
    const mine = { version, isMine: true, isOwner };
    if (kind === 'sign') next.signs.push({ sign: id, side, severity: value, ...mine });
    else if (kind === 'cause') next.causes.push({ cause: id, isPresent: value, ...mine });
    else {
      const { amount, ...said } = value;
      next.checks.push({ check: id, side, amountTyped: amount?.typed ?? null, ...said, ...mine });
    }
  }
  return { ...round, ...next };
}
