/** A prediction and what came: p = P(yes), 0 … 1. */
export interface Prediction {
  p: number;
  came: boolean;
}

/** Mean squared error of probabilities, 0 … 1 (Brier 1950). */
export function brierScore(predictions: readonly Prediction[]): number {
  return mean(predictions.map(({ p, came }) => (p - (came ? 1 : 0)) ** 2));
}

/** Mean negative logarithm of the probability given to what came, nats. */
export function logLoss(predictions: readonly Prediction[]): number {
  return mean(predictions.map(({ p, came }) => -Math.log(Math.max(1e-15, came ? p : 1 - p))));
}

export interface CalibrationBin {
  predicted: number;
  observed: number;
  count: number;
}

/** Mean prediction against observed share in bins of equal width; empty bins are left out. */
export function calibrationCurve(predictions: readonly Prediction[], bins: number): CalibrationBin[] {
  const groups = Array.from({ length: bins }, (): Prediction[] => []);
  for (const one of predictions) groups[Math.min(bins - 1, Math.floor(one.p * bins))]!.push(one);
  return groups
    .filter((group) => group.length > 0)
    .map((group) => ({
      predicted: mean(group.map(({ p }) => p)),
      observed: mean(group.map(({ came }) => (came ? 1 : 0))),
      count: group.length,
    }));
}

/** Expected calibration error: mean distance of the bins' two columns, by their counts (Guo et al. 2017). */
export function calibrationError(predictions: readonly Prediction[], bins: number): number {
  return calibrationCurve(predictions, bins).reduce(
    (sum, { predicted, observed, count }) =>
      sum + (count / predictions.length) * Math.abs(predicted - observed),
    0,
  );
}

/** χ² of ranks spread over equally likely bins (simulation-based calibration, Talts et al. 2018), with bins − 1 degrees. */
export function chiSquared(counts: readonly number[]): number {
  const expected = counts.reduce((a, b) => a + b, 0) / counts.length;
  return counts.reduce((sum, count) => sum + (count - expected) ** 2 / expected, 0);
}

/** P(χ² with so many degrees of freedom ≥ value), by the regularised incomplete gamma function (series or fraction). */
export function chiSquaredTail(value: number, degrees: number): number {
  const a = degrees / 2;
  const x = value / 2;
  if (x <= 0) return 1;
  const scale = Math.exp(a * Math.log(x) - x - logGamma(a));
  return x < a + 1 ? 1 - scale * lowerSeries(a, x) : scale * upperFraction(a, x);
}

function lowerSeries(a: number, x: number): number {
  let term = 1 / a;
  let sum = term;
  for (let n = 1; n < 1000 && term > sum * 1e-16; n++) {
    term *= x / (a + n);
    sum += term;
  }
  return sum;
}

/** Lentz's continued fraction. */
function upperFraction(a: number, x: number): number {
  let b = x + 1 - a;
  let c = 1e300;
  let d = 1 / b;
  let h = d;
  for (let n = 1; n < 1000; n++) {
    const an = -n * (n - a);
    b += 2;
    d = 1 / (an * d + b);
    c = b + an / c;
    const step = c * d;
    h *= step;
    if (Math.abs(step - 1) < 1e-15) break;
  }
  return h;
}

/** ln Γ(x) for x > 0 (Stirling's series after raising x). */
function logGamma(x: number): number {
  let shift = 0;
  let at = x;
  for (; at < 8; at++) shift -= Math.log(at);
  const inverse = 1 / (at * at);
  const series = (1 / 12 - inverse * (1 / 360 - inverse * (1 / 1260 - inverse / 1680))) / at;
  return shift + (at - 0.5) * Math.log(at) - at + 0.5 * Math.log(2 * Math.PI) + series;
}

function mean(values: readonly number[]): number {
  return values.reduce((a, b) => a + b, 0) / values.length;
}
