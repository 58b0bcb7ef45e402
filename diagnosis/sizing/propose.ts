import type { Chart } from '../chart/chart';
import { type Blend, blendsFrom } from './blend';
import { type BodyGirths, type LevelSize, sizeByLevel, type SizeRef, sizeWords, stopsAt } from './levels';

export interface Proposal {
  id: 'by-hip' | 'by-largest' | 'by-waist';
  /** The size whose paper is cut; the other levels are blended to. */
  base: SizeRef;
  reason: string;
  sources: readonly string[];
  blends: readonly Blend[];
}

export interface Choice {
  levels: readonly LevelSize[];
  /** The first is what Ruckle would cut; the rest are alternatives with another base. Empty where nothing can be compared. */
  proposals: readonly Proposal[];
  /** Where the chart stops short of the body. */
  stops: readonly string[];
}

const at = (levels: readonly LevelSize[], measure: string) => levels.find((one) => one.measure === measure);
const by = (levels: readonly LevelSize[], better: (a: number, b: number) => boolean) =>
  levels.reduce<LevelSize | null>((best, one) => (best === null || better(one.chosen.ordinal, best.chosen.ordinal) ? one : best), null); // prettier-ignore

/**
 * Which size to cut: by the hip, since the waist is easily altered and the crotch is not; or by the largest level, since cloth
 * can be taken in and not let out. Both are printed advice (TM043, TM042), so both are offered.
 * @param bodyChart bodies the sizes are for; @param finished the finished measures, may be empty
 * @param body girths in mm
 */
export function chooseSize(bodyChart: Chart, finished: Chart, body: BodyGirths): Choice {
  const levels = sizeByLevel(bodyChart, body);
  const proposals: Proposal[] = [];
  const offer = (id: Proposal['id'], level: LevelSize | null | undefined, reason: string, source: string) => {
    if (!level || proposals.some(({ base }) => base.ordinal === level.chosen.ordinal)) return;
    const base = level.chosen;
    proposals.push({ id, base, reason, sources: [source], blends: blendsFrom(base, levels, bodyChart, finished) }); // prettier-ignore
  };
  const hip = at(levels, 'hip');
  offer('by-hip', hip, `By your hip, ${hip ? sizeWords(hip.chosen) : ''}: seat and fork are hard to alter, waist and legs are not.`, 'trousers:TM043'); // prettier-ignore
  const largest = by(levels, (a, b) => a > b);
  offer('by-largest', largest, `By your largest level, the ${largest?.name.toLowerCase()}: everything can be taken in, nothing has to be let out.`, 'trousers:TM042'); // prettier-ignore
  const waist = at(levels, 'waist');
  offer(
    'by-waist',
    waist,
    'By your waist: least work at the band, most at seat and legs.',
    'common practice',
  );
  return { levels, proposals, stops: stopsAt(bodyChart, levels) };
}
