import type { Chart } from '@/diagnosis/chart/chart';
import { sizeAt, sizeWords } from '@/diagnosis/sizing/levels';
import type { SizeRef } from '@/diagnosis/sizing/levels';
import type { Proposal } from '@/diagnosis/sizing/propose';
import type { BaseOption } from './BaseChoice';

const option = (size: SizeRef) => ({ size: size.size, steps: size.steps, words: sizeWords(size) });

/** Every size of a chart, and one step past either end. */
export const levelOptions = (chart: Chart) =>
  Array.from({ length: chart.sizes.length + 2 }, (_, at) => option(sizeAt(chart, at - 1)));

/** The proposals, then the size that was chosen otherwise, then what the chart has where nothing was measured. */
export function baseOptions(proposals: readonly Proposal[], base: SizeRef | null, chart: Chart): BaseOption[] {
  const proposed = proposals.map(({ base: size, reason }) => ({ ...option(size), reason }));
  if (proposed.length === 0)
    return chart.sizes.map((_, at) => ({ ...option(sizeAt(chart, at)), reason: 'As the pattern names it.' }));
  if (!base || proposed.some(({ words }) => words === sizeWords(base))) return proposed;
  return [...proposed, { ...option(base), reason: 'As you chose.' }];
} // prettier-ignore
