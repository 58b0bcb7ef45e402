import type { CutFacts } from './before-the-cut';

/** A length as it was typed, and in mm. */
interface KeptLength {
  mm: number;
  typed: string;
}

/** What a journal keeps of the time before the first cut. */
export interface KeptCut extends Pick<CutFacts, 'sets' | 'cells' | 'clothKind' | 'stretchPercent'> {
  choices: Pick<CutFacts, 'sizes' | 'patternWaist' | 'altered' | 'leftOut'> & {
    ease: Readonly<Record<string, KeptLength>>;
    gauge: Readonly<Partial<Record<'relaxed' | 'pulled' | 'rested', KeptLength>>>;
  };
}

const lengths = (kept: Readonly<Record<string, KeptLength | undefined>>): Record<string, number> =>
  Object.fromEntries(Object.entries(kept).flatMap(([key, one]) => (one ? [[key, one.mm]] : [])));

/** The facts of a kept cut, typed words left aside. */
export function factsOf({ sets, cells, clothKind, stretchPercent, choices }: KeptCut): CutFacts {
  const { sizes, patternWaist, altered, leftOut, ease, gauge } = choices;
  const pulled = lengths(gauge);
  return { sets, cells, clothKind, stretchPercent, sizes, patternWaist, altered, leftOut, easeMm: lengths(ease), gauge: pulled }; // prettier-ignore
}
