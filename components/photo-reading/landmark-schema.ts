import { z } from 'zod';

const fraction = z.number().min(0).max(1);
/** More than a figure has in one view. */
const LANDMARKS_MAX = 40;

export const landmarksSaveSchema = z
  .strictObject({
    /** The revision of the photo that was tapped on. */
    revision: z.int().positive(),
    /** The version of the set that was seen, 0 for none. */
    seen: z.int().min(0),
    landmarks: z
      .array(
        z.strictObject({
          landmark: z
            .string()
            .regex(/^[a-z]+(-[a-z]+)*$/)
            .max(40),
          x: fraction,
          y: fraction,
        }),
      )
      .max(LANDMARKS_MAX),
  })
  .refine(
    ({ landmarks }) => new Set(landmarks.map(({ landmark }) => landmark)).size === landmarks.length,
    'Each point of the figure may be named once.',
  );
