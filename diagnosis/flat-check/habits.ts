import { measureOf, type MeasureId, type WaistPlace } from '../measuring/measures';

/** A finished measure of a garment that fitted. */
export interface FittedMeasure {
  garment: string;
  maker: string;
  cloth: 'woven' | 'stretch-woven' | 'knit';
  waist: WaistPlace | null;
  measure: MeasureId;
  valueMm: number;
}

/** The draft that is about to be cut, with its finished measures at the chosen sizes, mm. */
export interface DraftMeasures {
  maker: string;
  cloth: FittedMeasure['cloth'];
  waist: WaistPlace | null;
  finishedMm: Readonly<Partial<Record<MeasureId, number>>>;
}

export interface Habit {
  measure: MeasureId;
  name: string;
  /** Mean of the finished measures that fitted, mm. */
  fittedMm: number;
  garments: readonly string[];
  /** What fitted less what this draft gives, mm: + the draft wants more. */
  differenceMm: number;
}

const sameMaker = (a: string, b: string): boolean =>
  a.trim() !== '' && a.trim().toLowerCase() === b.trim().toLowerCase();

/**
 * Habits of a wearer, as finished measures that fitted, beside a new draft. Only the same maker's drafts in the same kind of
 * cloth are compared, and lengths from the waist only from the same waist: never "always 12 mm more" from one hand to another.
 */
export function habitsBeside(fitted: readonly FittedMeasure[], draft: DraftMeasures): Habit[] {
  const alike = fitted.filter(
    (one) =>
      sameMaker(one.maker, draft.maker) &&
      one.cloth === draft.cloth &&
      (!measureOf(one.measure).needsWaist || (one.waist !== null && one.waist === draft.waist)),
  );
  return [...new Set(alike.map(({ measure }) => measure))].flatMap((measure) => {
    const finished = draft.finishedMm[measure];
    if (finished === undefined) return [];
    const own = alike.filter((one) => one.measure === measure);
    const fittedMm = own.reduce((sum, { valueMm }) => sum + valueMm, 0) / own.length;
    const garments = [...new Set(own.map(({ garment }) => garment))];
    return [
      { measure, name: measureOf(measure).name, fittedMm, garments, differenceMm: fittedMm - finished },
    ];
  });
}
