export type GreyPicture = {
  readonly width: number;
  readonly height: number;
  /** Row by row, 0 black … 255 white. */
  readonly grey: ArrayLike<number>;
};

export type PhotoQuality = {
  /** Mean brightness, 0–1. */
  readonly brightness: number;
  /** How much of the picture's contrast sits in its finest detail; 0 for a flat or wholly blurred one. */
  readonly sharpness: number;
  readonly verdict: 'good' | 'dark' | 'glaring' | 'blurred';
};

/** Common practice, for pictures brought to about 320 pixels across: folds are still seen at these, and no longer below. */
const DARK = 0.18;
const GLARING = 0.88;
const BLURRED = 0.0012;

function spread(values: readonly number[]): { mean: number; variance: number } {
  const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
  return { mean, variance: values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / values.length };
}

/** The difference of each pixel from its four neighbours. */
function finest({ width, height, grey }: GreyPicture): number[] {
  const found: number[] = [];
  for (let y = 1; y + 1 < height; y += 1) {
    for (let x = 1; x + 1 < width; x += 1) {
      const at = y * width + x;
      found.push(4 * grey[at]! - grey[at - 1]! - grey[at + 1]! - grey[at - width]! - grey[at + width]!);
    }
  }
  return found;
}

/**
 * Whether folds can be read on a picture: bright enough, and sharp by the variance of its Laplacian (J. L. Pech-Pacheco and
 * others, "Diatom autofocusing in brightfield microscopy", 2000) over the variance of the picture itself, so that a plain
 * wall and a busy one are judged alike.
 * @param picture at least 3 × 3
 */
export function judgePhoto(picture: GreyPicture): PhotoQuality {
  const { mean, variance } = spread(Array.from(picture.grey));
  const detail = spread(finest(picture)).variance;
  const brightness = mean / 255;
  // Noise of the last digit is no detail.
  const sharpness = variance > 1 ? detail / (16 * variance) : 0;
  const verdict =
    brightness < DARK ? 'dark' : brightness > GLARING ? 'glaring' : sharpness < BLURRED ? 'blurred' : 'good';
  return { brightness, sharpness, verdict };
}
