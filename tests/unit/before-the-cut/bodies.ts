import type { MeasureId } from '@/diagnosis/measuring/measures';

/** mulberry32: the same bodies at each run. */
export function chance(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const normal = (next: () => number) => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());

const NAMES = [
  'waist',
  'hip',
  'thigh',
  'calf',
  'front-crotch-length',
  'back-crotch-length',
  'inseam',
] as const;

/** ANSUR II (2012 survey): means and standard deviations (mm) of B02, B03, B07, B11, B14, B06, B04, and their correlations. */
const SAMPLES = {
  women: {
    mean: [860.9053, 1021.2477, 616.1485, 373.2578, 278.9824, 341.858, 782.3172],
    sd: [99.9318, 75.8947, 55.8103, 28.5152, 29.5454, 28.6182, 44.6367],
    r: [
      [1, 0.8025, 0.759, 0.5646, 0.3956, 0.0759, 0.1191],
      [0.8025, 1, 0.9396, 0.7367, 0.5296, 0.4001, 0.242],
      [0.759, 0.9396, 1, 0.7666, 0.4953, 0.362, 0.2264],
      [0.5646, 0.7367, 0.7666, 1, 0.4435, 0.3256, 0.2196],
      [0.3956, 0.5296, 0.4953, 0.4435, 1, 0.0641, 0.1449],
      [0.0759, 0.4001, 0.362, 0.3256, 0.0641, 1, 0.2036],
      [0.1191, 0.242, 0.2264, 0.2196, 0.1449, 0.2036, 1],
    ],
  },
  men: {
    mean: [940.5774, 1019.5189, 625.1423, 392.2607, 266.4263, 355.9174, 845.9299],
    sd: [111.7059, 76.6811, 58.4522, 29.7088, 34.9707, 29.4957, 46.4992],
    r: [
      [1, 0.8758, 0.8253, 0.7057, 0.6114, 0.2113, 0.0544],
      [0.8758, 1, 0.943, 0.7927, 0.6431, 0.3658, 0.1826],
      [0.8253, 0.943, 1, 0.8036, 0.6114, 0.3401, 0.1381],
      [0.7057, 0.7927, 0.8036, 1, 0.5153, 0.2934, 0.1331],
      [0.6114, 0.6431, 0.6114, 0.5153, 1, 0.0416, 0.0748],
      [0.2113, 0.3658, 0.3401, 0.2934, 0.0416, 1, 0.1997],
      [0.0544, 0.1826, 0.1381, 0.1331, 0.0748, 0.1997, 1],
    ],
  },
};

function cholesky(matrix: readonly (readonly number[])[]): number[][] {
  const size = matrix.length;
  const lower = matrix.map(() => Array.from({ length: size }, () => 0));
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j <= i; j += 1) {
      let sum = matrix[i]![j]!;
      for (let k = 0; k < j; k += 1) sum -= lower[i]![k]! * lower[j]![k]!;
      lower[i]![j] = i === j ? Math.sqrt(sum) : sum / lower[j]![j]!;
    }
  }
  return lower;
}

export type DrawnBody = Record<(typeof NAMES)[number], number> & Partial<Record<MeasureId, number>>;

/** Bodies whose means, spreads and correlations are those of the survey; every other one of the women's sample. */
export function drawBodies(count: number, seed: number): DrawnBody[] {
  const next = chance(seed);
  const lowers = { women: cholesky(SAMPLES.women.r), men: cholesky(SAMPLES.men.r) };
  return Array.from({ length: count }, (_, n) => {
    const sample = n % 2 === 0 ? 'women' : 'men';
    const z = NAMES.map(() => normal(next));
    const value = (i: number) =>
      SAMPLES[sample].mean[i]! + SAMPLES[sample].sd[i]! * lowers[sample][i]!.reduce((sum, l, k) => sum + l * z[k]!, 0);
    return Object.fromEntries(NAMES.map((name, i) => [name, value(i)])) as DrawnBody;
  }); // prettier-ignore
}
