import type { Chart } from '../chart/chart';
import { measureOf, type MeasureId } from '../measuring/measures';
import { gradeOf, lengthAt, positionOf, type Grade } from './grade';

/** Levels at which trousers are cut to a size, from the waist down. */
export const SIZED_LEVELS = ['waist', 'high-hip', 'hip', 'thigh', 'knee', 'calf'] as const;
export type SizedLevel = (typeof SIZED_LEVELS)[number];

export type BodyGirths = Readonly<Partial<Record<MeasureId, number>>>;

/** A size by its place; beyond the ends of the chart the place goes on, and `steps` counts how far. */
export interface SizeRef {
  ordinal: number;
  /** The size as the chart names it; the last one where the chart stops. */
  size: string;
  /** Steps past that size, 0 within the chart, − below the smallest. */
  steps: number;
}

export interface LevelSize {
  measure: SizedLevel;
  name: string;
  bodyMm: number;
  /** Place between sizes, 2.5 half-way from the third to the fourth. */
  position: number;
  chosen: SizeRef;
  /** What the chart says there, mm; continued by its last step where `chosen.steps` is not 0. */
  chosenMm: number;
  /** The neighbours and how far the body is from each, mm: + the size is greater than the body. */
  neighbours: readonly { size: SizeRef; differenceMm: number }[];
}

/** A chart is continued at most so far; a body further out needs another draft. */
export const STEPS_MAX = 4;

/** A size of the chart by its place, with the steps that lie beyond its ends. */
export function sizeAt(chart: Chart, ordinal: number): SizeRef {
  const last = chart.sizes.length - 1;
  const kept = Math.min(last, Math.max(0, ordinal));
  return { ordinal, size: chart.sizes[kept]!, steps: ordinal - kept };
}

/** `14`, or `24 and two steps more` where the chart stops. */
export function sizeWords({ size, steps }: SizeRef): string {
  if (steps === 0) return size;
  const count = ['', 'one step', 'two steps', 'three steps', 'four steps'][Math.abs(steps)] ?? `${Math.abs(steps)} steps`; // prettier-ignore
  return `${size} and ${count} ${steps > 0 ? 'more' : 'less'}`;
}

/** Nearest size; half-way goes to the greater, for cloth can be taken in and not let out. */
const nearest = (position: number): number => Math.floor(position + 0.5);

function bounded(chart: Chart, ordinal: number): number {
  return Math.min(chart.sizes.length - 1 + STEPS_MAX, Math.max(-STEPS_MAX, ordinal));
}

function levelSize(chart: Chart, grade: Grade, measure: SizedLevel, bodyMm: number): LevelSize {
  const position = positionOf(grade, bodyMm);
  const ordinal = bounded(chart, nearest(position));
  const around = [Math.floor(position), Math.floor(position) + 1].map((one) => bounded(chart, one));
  const neighbours = [...new Set(around)].map((one) => ({
    size: sizeAt(chart, one),
    differenceMm: lengthAt(grade, one) - bodyMm,
  }));
  return { measure, name: measureOf(measure).name, bodyMm, position, chosen: sizeAt(chart, ordinal), chosenMm: lengthAt(grade, ordinal), neighbours }; // prettier-ignore
}

/** The size of each level that both the chart (of bodies) and the body have, from the waist down. */
export function sizeByLevel(chart: Chart, body: BodyGirths): LevelSize[] {
  return SIZED_LEVELS.flatMap((measure) => {
    const bodyMm = body[measure];
    const grade = gradeOf(chart, measure);
    return bodyMm === undefined || !grade ? [] : [levelSize(chart, grade, measure, bodyMm)];
  });
}

/** How far a body lies outside of what a chart is drawn for, by level, mm, and whether its continuation still reaches it. */
export function stopsAt(chart: Chart, levels: readonly LevelSize[]): string[] {
  return levels
    .filter(({ chosen }) => chosen.steps !== 0)
    .map(({ name, chosen, position }) => {
      const end = `${name}: this chart stops at ${chosen.size}.`;
      const beyond = position - (chosen.steps > 0 ? chart.sizes.length - 1 : 0);
      return Math.abs(beyond) > STEPS_MAX + 0.5
        ? `${end} You are more than ${STEPS_MAX} steps past it: another draft is less work than stretching this one.`
        : `${end} Its last step is carried on, ${sizeWords(chosen)}; such lines are marked, and less sure than drawn ones.`;
    });
}
