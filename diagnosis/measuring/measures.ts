/**
 * What a tape can tell before the first cut, as data, in the order of the body from the waist down (lengths last, for they
 * need the string at the waist). Errors are one standard deviation of a careful second person: common practice.
 */

export const WAIST_PLACES = ['narrowest', 'navel', 'band'] as const;
export type WaistPlace = (typeof WAIST_PLACES)[number];

export const WAIST_WORDS: Record<WaistPlace, { label: string; how: string }> = {
  narrowest: { label: 'The narrowest place', how: 'Bend to one side: where you fold is it. Tie the string there.' },
  navel: { label: 'Over the navel', how: 'Tie the string level, across the navel.' },
  band: { label: 'Where the band will sit', how: 'Tie the string where the top of these trousers is to be.' },
}; // prettier-ignore

export const MEASURE_IDS = [
  'waist', 'high-hip', 'hip', 'waist-to-hip', 'seated-depth', 'front-crotch-length', 'back-crotch-length',
  'crotch-length', 'thigh', 'knee', 'calf', 'ankle', 'instep', 'inseam', 'outseam', 'height',
] as const; // prettier-ignore
export type MeasureId = (typeof MEASURE_IDS)[number];

/** How it runs on the drawn figure: round the body at a level, or along it between two places of the figure. */
type Run = 'round' | 'along';

export interface Measure {
  id: MeasureId;
  name: string;
  /** How to take it, one or two sentences. */
  how: string;
  run: Run;
  /** The view of the figure it is drawn on. */
  view: 'front' | 'back' | 'left' | 'seated';
  /** Height on the figure: 0 the waist, 1 the crotch line, 2.6 about the knee (crotch depths below the waist). */
  level: { from: number; to: number };
  tapeSdMm: number;
  /** Lengths below and above which a slip is likelier than a body, mm. Wide on purpose: bodies are. */
  usualMm: { from: number; to: number };
  /** Taken from the string at the waist: another waist is another length. */
  needsWaist: boolean;
  sources: readonly string[];
}

const CP = ['common practice'] as const;

export const MEASURES: readonly Measure[] = [
  { id: 'waist', name: 'Waist', how: 'Tie a string round the waist that is meant and let it settle. Measure along it, breathing out, as close as a band is worn.', run: 'round', view: 'front', level: { from: 0, to: 0 }, tapeSdMm: 8, usualMm: { from: 420, to: 2000 }, needsWaist: true, sources: ['trousers:TM001', 'standards:B26'] },
  { id: 'high-hip', name: 'High hip', how: 'Round the fullest place of the front, 8 to 10 cm (3 to 4 in) below the string, the tape level.', run: 'round', view: 'front', level: { from: 0.38, to: 0.38 }, tapeSdMm: 8, usualMm: { from: 480, to: 2050 }, needsWaist: false, sources: ['trousers:TM002'] },
  { id: 'hip', name: 'Hip', how: 'Round the fullest place of the seat, above the fork, the tape level. A full front: hold a card flat against it and measure over the card.', run: 'round', view: 'back', level: { from: 0.75, to: 0.75 }, tapeSdMm: 8, usualMm: { from: 550, to: 2100 }, needsWaist: false, sources: ['trousers:TM004', 'trousers:TM005', 'trousers:TM006'] },
  { id: 'waist-to-hip', name: 'Waist to hip', how: 'At the side, from the string down to where the hip was taken.', run: 'along', view: 'left', level: { from: 0, to: 0.75 }, tapeSdMm: 8, usualMm: { from: 70, to: 330 }, needsWaist: true, sources: ['trousers:TM004'] },
  { id: 'seated-depth', name: 'Crotch depth, seated', how: 'Sit upright on a flat, hard seat. At the side, from the string over the hip and straight down to the seat. Left and right may differ: take both.', run: 'along', view: 'seated', level: { from: 0, to: 1 }, tapeSdMm: 10, usualMm: { from: 140, to: 450 }, needsWaist: true, sources: ['trousers:TM012', 'standards:D07'] },
  { id: 'front-crotch-length', name: 'Crotch length, front', how: 'Hang a ring or a key on a string and pass the string between the legs, front to back. Where the weight settles is the inseam; from there up to the front waist string.', run: 'along', view: 'front', level: { from: 0, to: 1 }, tapeSdMm: 15, usualMm: { from: 170, to: 560 }, needsWaist: true, sources: ['trousers:TM014', 'trousers:TM015'] },
  { id: 'back-crotch-length', name: 'Crotch length, back', how: 'From the same weight up to the string at the back waist.', run: 'along', view: 'back', level: { from: 0, to: 1 }, tapeSdMm: 15, usualMm: { from: 220, to: 680 }, needsWaist: true, sources: ['trousers:TM014', 'trousers:TM015'] },
  { id: 'crotch-length', name: 'Crotch length, whole', how: 'From the front string between the legs to the back string, standing, neither loose nor pulled. Without the weight nobody can say how it divides.', run: 'along', view: 'left', level: { from: 0, to: 1 }, tapeSdMm: 18, usualMm: { from: 420, to: 1200 }, needsWaist: true, sources: ['trousers:TM014', 'standards:B05'] },
  { id: 'thigh', name: 'Thigh', how: 'Round one leg, 25 mm (1 in) below the fork, standing on both feet.', run: 'round', view: 'front', level: { from: 1.12, to: 1.12 }, tapeSdMm: 8, usualMm: { from: 300, to: 1150 }, needsWaist: false, sources: ['trousers:TM007', 'trousers:TM008'] },
  { id: 'knee', name: 'Knee', how: 'Round the knee, bent as for sitting.', run: 'round', view: 'front', level: { from: 2.45, to: 2.45 }, tapeSdMm: 6, usualMm: { from: 220, to: 760 }, needsWaist: false, sources: ['trousers:TM009'] },
  { id: 'calf', name: 'Calf', how: 'Round the fullest place below the knee, standing.', run: 'round', view: 'back', level: { from: 2.85, to: 2.85 }, tapeSdMm: 5, usualMm: { from: 200, to: 720 }, needsWaist: false, sources: ['trousers:TM010'] },
  { id: 'ankle', name: 'Ankle', how: 'Round the narrowest place above the foot.', run: 'round', view: 'front', level: { from: 3.65, to: 3.65 }, tapeSdMm: 4, usualMm: { from: 140, to: 440 }, needsWaist: false, sources: CP },
  { id: 'instep', name: 'Heel over instep', how: 'Round the heel and over the instep: what a narrow hem has to pass.', run: 'round', view: 'left', level: { from: 3.85, to: 3.85 }, tapeSdMm: 5, usualMm: { from: 210, to: 480 }, needsWaist: false, sources: ['trousers:TM010'] },
  { id: 'inseam', name: 'Inseam', how: 'Stand with a book held up between the legs. From its upper edge to the floor, then take off what the hem is to clear.', run: 'along', view: 'front', level: { from: 1, to: 3.9 }, tapeSdMm: 8, usualMm: { from: 380, to: 1150 }, needsWaist: false, sources: ['trousers:TM011'] },
  { id: 'outseam', name: 'Outseam', how: 'At the side, from the string over the hip to the floor, then take off what the hem is to clear.', run: 'along', view: 'left', level: { from: 0, to: 3.9 }, tapeSdMm: 10, usualMm: { from: 500, to: 1450 }, needsWaist: true, sources: ['trousers:TM011'] },
  { id: 'height', name: 'Height', how: 'Without shoes, back to a wall, a book flat on the head.', run: 'along', view: 'front', level: { from: -1.2, to: 4 }, tapeSdMm: 10, usualMm: { from: 900, to: 2250 }, needsWaist: false, sources: CP },
]; // prettier-ignore

const BY_ID = new Map<string, Measure>(MEASURES.map((measure) => [measure.id, measure]));

export const isMeasureId = (id: string): id is MeasureId => BY_ID.has(id);

/** @throws RangeError never for a `MeasureId`: the list holds each. */
export function measureOf(id: MeasureId): Measure {
  const found = BY_ID.get(id);
  if (!found) throw new RangeError(`no measure "${id}"`);
  return found;
}
