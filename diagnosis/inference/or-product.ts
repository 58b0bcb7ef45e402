/**
 * Products over patterns of reached findings, combined by OR and without one subtraction, so that no digit is lost.
 * Two sources with weights f and t over one finding combine to (f0·t0, f0·t1 + f1·(t0 + t1)); over several findings the
 * same rule is applied to one of them, its products being products over the others: three of half the size.
 * Expanding by inclusion and exclusion instead (Heckerman 1989, Quickscore) cancels badly at many positive findings.
 *
 * A pattern array over `bits` local bits and `run` patterns of other bits has index local · run + rest.
 */

/** out += f ∘ t, where f and out run over local and other bits, t over the local bits alone. */
export function orProduct(
  bits: number,
  run: number,
  f: Float64Array,
  fAt: number,
  t: Float64Array,
  tAt: number,
  out: Float64Array,
  outAt: number,
  spare: Float64Array,
  spareAt: number,
): void {
  if (bits === 0) {
    const weight = t[tAt]!;
    if (weight === 0) return;
    for (let i = 0; i < run; i++) out[outAt + i]! += f[fAt + i]! * weight;
    return;
  }
  const half = 1 << (bits - 1);
  const far = half * run;
  for (let i = 0; i < half; i++) spare[spareAt + i] = t[tAt + i]! + t[tAt + half + i]!;
  const next = spareAt + half;
  orProduct(bits - 1, run, f, fAt, t, tAt, out, outAt, spare, next);
  orProduct(bits - 1, run, f, fAt, t, tAt + half, out, outAt + far, spare, next);
  orProduct(bits - 1, run, f, fAt + far, spare, spareAt, out, outAt + far, spare, next);
}

/** out[s] += Σ t[p] · b[s | p]: what the findings still open will weigh, seen from before a source has fired. */
export function orBackward(
  bits: number,
  run: number,
  t: Float64Array,
  tAt: number,
  b: Float64Array,
  bAt: number,
  out: Float64Array,
  outAt: number,
  spare: Float64Array,
  spareAt: number,
): void {
  if (bits === 0) {
    const weight = t[tAt]!;
    if (weight === 0) return;
    for (let i = 0; i < run; i++) out[outAt + i]! += b[bAt + i]! * weight;
    return;
  }
  const half = 1 << (bits - 1);
  const far = half * run;
  for (let i = 0; i < half; i++) spare[spareAt + i] = t[tAt + i]! + t[tAt + half + i]!;
  const next = spareAt + half;
  orBackward(bits - 1, run, t, tAt, b, bAt, out, outAt, spare, next);
  orBackward(bits - 1, run, t, tAt + half, b, bAt + far, out, outAt, spare, next);
  orBackward(bits - 1, run, spare, spareAt, b, bAt + far, out, outAt + far, spare, next);
}

/** w[p] += Σ f[s] · b[s | p]: the weight of each pattern of firings of one source, all other evidence considered. */
export function orWeights(
  bits: number,
  run: number,
  f: Float64Array,
  fAt: number,
  b: Float64Array,
  bAt: number,
  w: Float64Array,
  wAt: number,
  spare: Float64Array,
  spareAt: number,
): void {
  if (bits === 0) {
    let sum = 0;
    for (let i = 0; i < run; i++) sum += f[fAt + i]! * b[bAt + i]!;
    w[wAt]! += sum;
    return;
  }
  const half = 1 << (bits - 1);
  const far = half * run;
  for (let i = 0; i < far; i++) spare[spareAt + i] = f[fAt + i]! + f[fAt + far + i]!;
  const next = spareAt + far;
  orWeights(bits - 1, run, f, fAt, b, bAt, w, wAt, spare, next);
  orWeights(bits - 1, run, f, fAt + far, b, bAt + far, w, wAt, spare, next);
  orWeights(bits - 1, run, spare, spareAt, b, bAt + far, w, wAt + half, spare, next);
}
