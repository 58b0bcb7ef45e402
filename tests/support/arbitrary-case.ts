import fc from 'fast-check';
import type { CaseInput } from '@/diagnosis/case-schema';
import type { Knowledge } from '@/diagnosis/garments/schema';

type Sided = { id: string; sided: boolean };

function sideOf({ sided }: Sided) {
  return sided
    ? fc.constantFrom('both' as const, 'left' as const, 'right' as const)
    : fc.constant('both' as const);
}

/** Some of the items, each once, with a side where it has one. */
function someOf<T extends Sided>(items: readonly T[], most: number) {
  return fc
    .uniqueArray(fc.constantFrom(...items), { maxLength: most, selector: ({ id }) => id })
    .chain((chosen) => fc.tuple(...chosen.map((item) => sideOf(item).map((side) => ({ item, side })))));
}

function evidence(knowledge: Knowledge) {
  const lengths = fc.double({ min: -40, max: 40, noNaN: true });
  const measured = fc
    .uniqueArray(fc.constantFrom(...knowledge.dimensions), {
      minLength: 1,
      maxLength: 2,
      selector: ({ id }) => id,
    })
    .chain((dimensions) =>
      fc.record({
        terms: fc.tuple(...dimensions.map((one) => sideOf(one).map((side) => ({ dimension: one.id, side })))),
        needMm: lengths,
        sdMm: fc.double({ min: 3, max: 15, noNaN: true }),
      }),
    );
  return fc
    .record({
      noted: someOf(knowledge.signs, 8),
      severities: fc.array(fc.integer({ min: 0, max: 3 }), { minLength: 8, maxLength: 8 }),
      measured: fc.array(measured, { maxLength: 1 }),
      checks: someOf(knowledge.checks, 2),
      outcome: fc.nat(),
    })
    .map(({ noted, severities, measured: sums, checks, outcome }) => ({
      signs: noted
        .slice(0, 5)
        .map(({ item, side }, i) => ({ sign: item.id, side, severity: severities[i]! })),
      absent: noted.slice(5).map(({ item, side }) => ({ sign: item.id, side })),
      measured: sums,
      tests: checks.map(({ item, side }) => ({
        check: item.id,
        side,
        outcome: item.outcomes[outcome % item.outcomes.length]!.id,
      })),
    }));
}

function pastRound(knowledge: Knowledge) {
  const changes = someOf(knowledge.corrections, 2).map((chosen) =>
    chosen.map(({ item, side }) => ({ correction: item.id, side, ...(item.amounts ? { amountMm: 8 } : {}) })),
  );
  return fc.tuple(evidence(knowledge), changes).map(([round, made]) => ({ ...round, changes: made }));
}

/** Cases of a garment with a little of every kind of evidence, some with an earlier round. */
export function arbitraryCase(knowledge: Knowledge): fc.Arbitrary<CaseInput> {
  return fc
    .record({
      now: evidence(knowledge),
      history: fc.array(pastRound(knowledge), { maxLength: 2 }),
      shape: fc.subarray(knowledge.shape.map(({ id }) => id)),
    })
    .map(({ now, history, shape }) => ({ garment: knowledge.garment, ...now, history, shape }));
}

/** The same case seen in a mirror. */
export function mirrored<T>(value: T): T {
  if (value === 'left') return 'right' as T;
  if (value === 'right') return 'left' as T;
  if (Array.isArray(value)) return value.map(mirrored) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, mirrored(inner)])) as T;
}
