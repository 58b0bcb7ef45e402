/** Values on the pixels of a picture, row by row. */
export type Field = { readonly width: number; readonly height: number; readonly data: Float32Array };

export function emptyField(width: number, height: number): Field {
  return { width, height, data: new Float32Array(width * height) };
}

function blurLine(
  from: Float32Array,
  to: Float32Array,
  start: number,
  step: number,
  count: number,
  radius: number,
) {
  const norm = 1 / (2 * radius + 1);
  const read = (index: number) => from[start + Math.min(count - 1, Math.max(0, index)) * step]!;
  let sum = 0;
  for (let i = -radius; i <= radius; i += 1) sum += read(i);
  for (let i = 0; i < count; i += 1) {
    to[start + i * step] = sum * norm;
    sum += read(i + radius + 1) - read(i - radius);
  }
}

/** Three box blurs, close to a Gaussian of that radius in pixels. */
export function blurred(field: Field, radiusPx: number): Field {
  const { width, height } = field;
  const radius = Math.max(1, Math.round(radiusPx * 0.6));
  const [a, b] = [Float32Array.from(field.data), new Float32Array(field.data.length)];
  for (let pass = 0; pass < 3; pass += 1) {
    for (let y = 0; y < height; y += 1) blurLine(a, b, y * width, 1, width, radius);
    for (let x = 0; x < width; x += 1) blurLine(b, a, x, width, height, radius);
  }
  return { width, height, data: a };
}

/** The field at a place between pixels. */
export function sampled({ width, height, data }: Field, x: number, y: number): number {
  const cx = Math.min(width - 1.001, Math.max(0, x));
  const cy = Math.min(height - 1.001, Math.max(0, y));
  const [x0, y0] = [Math.floor(cx), Math.floor(cy)];
  const [fx, fy] = [cx - x0, cy - y0];
  const at = y0 * width + x0;
  const top = data[at]! * (1 - fx) + data[at + 1]! * fx;
  const bottom = data[at + width]! * (1 - fx) + data[at + width + 1]! * fx;
  return top * (1 - fy) + bottom * fy;
}

function shrunk(mask: Field, by: number): Field {
  const small = emptyField(Math.ceil(mask.width / by), Math.ceil(mask.height / by));
  for (let y = 0; y < small.height; y += 1) {
    for (let x = 0; x < small.width; x += 1) {
      small.data[y * small.width + x] = sampled(mask, x * by + by / 2, y * by + by / 2);
    }
  }
  return small;
}

const SHRINK = 4;
const SWEEPS = 260;
const OVER_RELAXATION = 1.94;

/**
 * A rounded body over a flat shape: solves Poisson's equation inside the mask by successive over-relaxation (Young 1954)
 * and takes the root, which over a strip is a half cylinder. Heights in pixels; `depth` 1 is as deep as half as wide.
 */
export function inflated(mask: Field, depth: number): Field {
  const small = shrunk(mask, SHRINK);
  const { width, height, data: inside } = small;
  const u = new Float32Array(width * height);
  const places: number[] = [];
  for (let y = 1; y < height - 1; y += 1) {
    for (let x = 1; x < width - 1; x += 1) if (inside[y * width + x]! >= 0.5) places.push(y * width + x);
  }
  for (let sweep = 0; sweep < SWEEPS; sweep += 1) {
    for (const i of places) {
      // No wall at the upper frame: a body that leaves the picture stays round there.
      const above = i < 2 * width ? u[i + width]! : u[i - width]!;
      const settled = (u[i - 1]! + u[i + 1]! + above + u[i + width]! + 1) / 4;
      u[i] = Math.max(0, u[i]! + OVER_RELAXATION * (settled - u[i]!));
    }
  }
  for (let x = 0; x < width; x += 1) u[x] = u[width + x]!;
  const low: Field = { width, height, data: u.map((value) => Math.sqrt(2 * value) * SHRINK * depth) };
  const smooth = blurred(low, 1.2);
  const full = emptyField(mask.width, mask.height);
  for (let y = 0; y < mask.height; y += 1) {
    for (let x = 0; x < mask.width; x += 1) {
      full.data[y * mask.width + x] = sampled(smooth, x / SHRINK - 0.5, y / SHRINK - 0.5);
    }
  }
  return blurred(full, 3);
}
