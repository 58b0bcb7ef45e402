import { sampled, type Field } from './field';

/** A lamp from the side, a little above: folds show in raking light and vanish in a flash. Unit vector, y downward, z to the camera. */
const LAMP = { x: -0.72, y: -0.3, z: 0.626 };
const AMBIENT = 0.34;
const LAMP_STRENGTH = 0.78;
const FILL_STRENGTH = 0.12;
const SHADOW_STEPS = 14;
const SHADOW_STEP_PX = 4;

/** How bright a matt surface of this relief (heights in pixels) is at a pixel; about 0.3 in shade to 1.1 facing the lamp. */
export function lambert(relief: Field, x: number, y: number): number {
  const { width, height, data } = relief;
  const [left, right] = [Math.max(0, x - 1), Math.min(width - 1, x + 1)];
  const [above, below] = [Math.max(0, y - 1), Math.min(height - 1, y + 1)];
  const slopeX = (data[y * width + right]! - data[y * width + left]!) / (right - left);
  const slopeY = (data[below * width + x]! - data[above * width + x]!) / (below - above);
  const length = Math.hypot(slopeX, slopeY, 1);
  const facing = (-slopeX * LAMP.x - slopeY * LAMP.y + LAMP.z) / length;
  const fill = (slopeX * LAMP.x * 0.9 + LAMP.z * 0.6) / length;
  return AMBIENT + LAMP_STRENGTH * Math.max(0, facing) + FILL_STRENGTH * Math.max(0, fill);
}

/** 0 in full light … 1 where the relief between the pixel and the lamp hides it; soft at the edge. */
export function castShadow(relief: Field, x: number, y: number): number {
  const run = Math.hypot(LAMP.x, LAMP.y);
  const [stepX, stepY] = [(LAMP.x / run) * SHADOW_STEP_PX, (LAMP.y / run) * SHADOW_STEP_PX];
  const climb = (LAMP.z / run) * SHADOW_STEP_PX;
  const from = relief.data[y * relief.width + x]!;
  let hidden = 0;
  for (let i = 1; i <= SHADOW_STEPS; i += 1) {
    const over = sampled(relief, x + stepX * i, y + stepY * i) - (from + climb * i);
    hidden = Math.max(hidden, Math.min(1, over / (2 + i * 0.7)));
  }
  return hidden;
}
