import { clothVerdict, type ClothVerdict } from '../ease/cloth-verdict';
import { stretchTest } from '../ease/stretch';
import { type EaseSplit, splitEase, wovenEase } from '../ease/wearing-ease';
import { type Difference, flatCheck, type NotCompared } from '../flat-check/flat-check';
import { type Advice, adviseOn } from '../flat-check/suggest';
import type { Knowledge } from '../garments/schema';
import { measureOf, type MeasureId, type WaistPlace } from '../measuring/measures';
import { type Blend, blendsFrom } from '../sizing/blend';
import type { LevelSize, SizeRef } from '../sizing/levels';
import { type BodyLengths, bodyOf, byMeasure, girthsOf, type MeasuredSet } from './body';
import { type Charts, chartsOf, type CutSizes, cutSizes, type KeptSizes, patternAt, type PatternCell } from './sized-pattern'; // prettier-ignore

/** Everything that is known before the first cut; lengths in mm. */
export interface CutFacts {
  /** Newest first. */
  sets: readonly MeasuredSet[];
  cells: readonly PatternCell[];
  clothKind: 'woven' | 'stretch-woven' | 'knit';
  /** Gauge stretch that the draft asks for, per cent. */
  stretchPercent: number;
  sizes: KeptSizes;
  patternWaist: WaistPlace | null;
  easeMm: Readonly<Record<string, number>>;
  gauge: Readonly<Partial<Record<'relaxed' | 'pulled' | 'rested', number>>>;
  altered: readonly string[];
  leftOut: readonly string[];
}

export interface CheckedDifference extends Difference {
  advice: Advice;
  /** What was altered on paper first, mm of the need. */
  alteredMm: number;
  isLeftOut: boolean;
}

export interface EaseRow extends EaseSplit {
  measure: MeasureId;
  name: string;
  /** Print knows an ease for woven cloth only. */
  isJudged: boolean;
}

export interface BeforeTheCut {
  body: BodyLengths;
  charts: Charts;
  sizes: CutSizes;
  levels: readonly (LevelSize & { cut: SizeRef })[];
  blends: readonly Blend[];
  ease: readonly EaseRow[];
  /** Null until the gauge was pulled. */
  cloth: ClothVerdict | null;
  differences: readonly CheckedDifference[];
  notCompared: readonly NotCompared[];
}

/** Stretch of the gauge as far as it was measured: without a rest there is no recovery. Null before it was pulled. */
function clothOf({ relaxed, pulled, rested }: CutFacts['gauge']) {
  if (relaxed === undefined || pulled === undefined || !(relaxed > 0) || pulled < relaxed) return null;
  const test = rested === undefined ? null : stretchTest(relaxed, pulled, rested);
  return {
    stretchPercent: (pulled / relaxed - 1) * 100,
    recoveryPercent: test?.recoveryPercent ?? null,
    growthPercent: test?.growthPercent ?? null,
  };
}

function easeRows(body: BodyLengths, pattern: ReturnType<typeof patternAt>, isWoven: boolean): EaseRow[] {
  return (['waist', 'high-hip', 'hip', 'seated-depth', 'thigh', 'knee'] as const).flatMap((measure) => {
    const bodyMm = body[measure]?.meanMm;
    const garmentMm = pattern[measure]?.garmentMm ?? null;
    const range = wovenEase(measure, body.hip?.meanMm ?? 1000);
    if (bodyMm === undefined || garmentMm === null || !range) return [];
    return [{ measure, name: measureOf(measure).name, isJudged: isWoven, ...splitEase(bodyMm, garmentMm, range) }]; // prettier-ignore
  });
}

/** Body, chart, cloth and flat pattern together: the sizes, the blends, the ease, the verdict on the cloth, and each difference. */
export function beforeTheCut(knowledge: Knowledge, facts: CutFacts): BeforeTheCut {
  const body = bodyOf(facts.sets, facts.patternWaist);
  const girths = girthsOf(body);
  const charts = chartsOf(facts.cells);
  const sizes = cutSizes(charts, girths, facts.sizes);
  const pattern = patternAt(charts, sizes);
  const levels = sizes.choice.levels.map((level) => ({ ...level, cut: sizes.at(level.measure) ?? level.chosen }));
  const { patternWaist, clothKind, stretchPercent } = facts;
  const checked = flatCheck(knowledge, { body, pattern, patternWaist, cloth: clothKind, easeMm: byMeasure(facts.easeMm) });
  const size = { hipMm: girths.hip ?? 1000, waistMm: girths.waist, thighMm: girths.thigh, kneeMm: girths.knee, calfMm: girths.calf };
  const differences = checked.differences.map((difference): CheckedDifference => {
    const advice = adviseOn(knowledge, difference, size);
    const met = advice.kind === 'change' ? advice.suggestions.reduce((sum, { meetsMm }) => sum + meetsMm, 0) : 0;
    const alteredMm = facts.altered.includes(difference.measure) ? met : 0;
    return { ...difference, advice, alteredMm, isLeftOut: facts.leftOut.includes(difference.measure) };
  });
  const cloth = clothOf(facts.gauge);
  const worn = levels.flatMap(({ measure, name, bodyMm }) => {
    const finishedMm = pattern[measure]?.garmentMm;
    return finishedMm === undefined || finishedMm === null ? [] : [{ measure, name, bodyMm, finishedMm }];
  });
  return {
    body, charts, sizes, levels, differences,
    blends: sizes.base ? blendsFrom(sizes.base, levels.map((level) => ({ ...level, chosen: level.cut })), charts.body, charts.garment) : [],
    ease: easeRows(body, pattern, clothKind === 'woven'),
    cloth: cloth && clothVerdict(stretchPercent, cloth, worn),
    notCompared: checked.notCompared,
  };
} // prettier-ignore

/** What goes into the reading of the first round: each difference that was not left out, less what was altered first. */
export const evidenceOf = ({ differences }: BeforeTheCut): CheckedDifference[] =>
  differences
    .filter(({ isLeftOut }) => !isLeftOut)
    .map((one) => ({ ...one, needMm: one.needMm - one.alteredMm }));
