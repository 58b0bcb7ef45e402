import type { TestResult } from '../case-schema';
import type { Check, Link } from '../garments/schema';
import type { Draft } from './draft';
import { type Hindsight, seenWith } from './hindsight';
import { GRID_REACH, SD_MIN_Z, zAt } from './grid';
import { variablesFor } from './layout';
import type { Layout } from './layout';
import { reaching, sourcesOf } from './sources';
import type { Tables } from './sources';

/** P(an outcome comes although nothing that it speaks for is there). */
export const OUTCOME_LEAK = 0.04;
/** Links of what remains when nothing else happened only lean: this much of it comes by itself. */
const REMAINDER_LEAK = 0.4;
/** Standard deviation of a pinned or gaping amount: at least this, mm, and this share of it. */
const AMOUNT_SD_MM = { pinch: 3, gap: 4 } as const;
const AMOUNT_SD_SHARE = 0.1;

/** Adds what a check showed: outcomes are tried in order, so the earlier ones did not happen; then its amount. */
export function addTest(
  draft: Draft,
  layout: Layout,
  tables: Tables,
  test: TestResult,
  hindsight: Hindsight | null,
): void {
  const check = layout.index.knowledge.checks[layout.index.checks.get(test.check)!]!;
  const at = check.outcomes.findIndex(({ id }) => id === test.outcome);
  const went = hindsight?.wentAnswer(test.check, test.side) ? hindsight : null;
  addOutcome(draft, layout, tables, check, at, test.side, went);
  if (test.amountMm !== null) addAmount(draft, layout, check, at, test);
}

/** Adds the outcome at a place of a check: a noisy-OR that fired, after those before it that did not. */
export function addOutcome(
  draft: Draft,
  layout: Layout,
  tables: Tables,
  check: Check,
  at: number,
  side: TestResult['side'],
  went: Hindsight | null = null,
): void {
  for (const { links } of check.outcomes.slice(0, at))
    for (const source of sourcesOf(layout, tables, links, side, 1))
      draft.temper(source.variable, (state) => Math.log(source.cumulative[0]![state]!));
  const { id, links } = check.outcomes[at]!;
  const leak = (at === check.outcomes.length - 1 ? REMAINDER_LEAK : OUTCOME_LEAK) * (went?.leftOfLeak ?? 1);
  const slots = sourcesOf(layout, tables, links, side, 1).map((source) => {
    const { miss } = reaching(source, 1);
    const fires = { miss, hit: miss.map((stays) => 1 - stays) };
    return { variable: source.variable, ...seenWith(fires, went?.leftOf(source.variable)), parts: [0] };
  });
  if (slots.length > 0)
    draft.findings.push({
      slots,
      leak: Float64Array.of(1 - leak, leak),
      weight: 4,
      key: `${check.id} ${id} ${side}`,
    });
}

/** Millimetres of the dimension's own basis that a test's amount stands for, unsigned. */
export function amountInOwnBasis(check: Check, layout: Layout, test: TestResult): number {
  const dimension =
    layout.index.knowledge.dimensions[layout.index.dimensions.get(check.amountTo!.dimension)!]!;
  const per = test.basis === null || test.basis === dimension.basis ? 1 : dimension.conversions[test.basis]!;
  return test.amountMm! * per * test.places;
}

function addAmount(draft: Draft, layout: Layout, check: Check, at: number, test: TestResult): void {
  const { amountTo, amount, outcomes } = check;
  if (!amountTo || amount === 'none') return;
  const speaks = ({ to, direction }: Link) => to === amountTo.dimension && direction === amountTo.direction;
  const linked = outcomes.map(({ links }) => links.some(speaks));
  // An amount beside "it did not clear" is what was tried, not what is needed.
  if (linked.includes(true) && !linked[at]) return;
  const dimension = layout.index.dimensions.get(amountTo.dimension)!;
  const own = amountInOwnBasis(check, layout, test);
  // Errors of several folds partly cancel.
  const perMm = own / (test.amountMm! * Math.sqrt(test.places));
  const sdMm = Math.hypot(AMOUNT_SD_MM[amount] * perMm * layout.factors.length, AMOUNT_SD_SHARE * own);
  const needMm = amountTo.direction === 'more' ? own : -own;
  for (const variable of variablesFor(layout, dimension, test.side))
    addGaussian(draft, variable, needMm / layout.scaleMm[dimension]!, sdMm / layout.scaleMm[dimension]!);
}

/** Multiplies a need's belief by a Gaussian, in z; the end bins mean "at least", so a mean beyond them lies on them. */
export function addGaussian(draft: Draft, variable: number, meanZ: number, sdZ: number): void {
  const mean = Math.min(GRID_REACH, Math.max(-GRID_REACH, meanZ));
  const sd = Math.max(SD_MIN_Z, sdZ);
  draft.temper(variable, (bin) => -0.5 * ((zAt(bin) - mean) / sd) ** 2);
}
