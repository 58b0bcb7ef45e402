import { type FittedMeasure, type Habit, habitsBeside } from '../flat-check/habits';
import { isMeasureId, type WaistPlace } from '../measuring/measures';
import type { BeforeTheCut } from './before-the-cut';
import { patternAt } from './sized-pattern';

interface Draft {
  maker: string;
  clothKind: FittedMeasure['cloth'];
  choices: { patternWaist: WaistPlace | null };
  fittedElsewhere: readonly (Omit<FittedMeasure, 'measure'> & { measure: string })[];
}

/** Habits of the wearer beside this draft, at the sizes that are cut. */
export function habitsOf({ maker, clothKind, choices, fittedElsewhere }: Draft, cut: BeforeTheCut): Habit[] {
  const fitted = fittedElsewhere.flatMap(({ measure, ...rest }) => (isMeasureId(measure) ? [{ ...rest, measure }] : [])); // prettier-ignore
  const finishedMm = Object.fromEntries(
    Object.entries(patternAt(cut.charts, cut.sizes)).flatMap(([id, { garmentMm }]) =>
      garmentMm === null ? [] : [[id, garmentMm]],
    ),
  );
  return habitsBeside(fitted, { maker, cloth: clothKind, waist: choices.patternWaist, finishedMm });
}
