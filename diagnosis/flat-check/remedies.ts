import type { MeasureId } from '../measuring/measures';

/** A correction of the garment's knowledge and the share of a difference that it is to meet. */
export interface Remedy {
  correction: string;
  share: number;
}

/**
 * What to change on paper for a difference before anything is sewn. A tape cannot divide a sum, so each remedy is the plainest
 * operator of its sum and meets the middle of it; the muslin divides the rest. A whole crotch length has none: it does not say
 * whether front or back is meant.
 */
export const REMEDIES: Partial<Record<MeasureId, { more: readonly Remedy[]; less: readonly Remedy[] }>> = {
  waist: {
    more: [{ correction: 'let-out-waist-front', share: 0.5 }, { correction: 'let-out-waist-back', share: 0.5 }],
    less: [{ correction: 'take-in-waist-front', share: 0.5 }, { correction: 'deepen-back-dart', share: 0.5 }],
  },
  hip: { more: [{ correction: 'let-out-hip-side', share: 1 }], less: [{ correction: 'take-in-hip-side', share: 1 }] },
  'seated-depth': { more: [{ correction: 'lengthen-depth', share: 1 }], less: [{ correction: 'shorten-depth', share: 1 }] },
  'front-crotch-length': { more: [{ correction: 'wedge-into-front', share: 1 }], less: [{ correction: 'lower-centre-front', share: 1 }] },
  'back-crotch-length': { more: [{ correction: 'wedge-into-back', share: 1 }], less: [{ correction: 'pin-out-back-fold', share: 1 }] },
  thigh: { more: [{ correction: 'let-out-thigh-side', share: 1 }], less: [{ correction: 'take-in-thigh-side', share: 1 }] },
  knee: { more: [{ correction: 'let-out-knee', share: 1 }], less: [{ correction: 'take-in-knee', share: 1 }] },
  calf: { more: [{ correction: 'let-out-calf', share: 1 }], less: [] },
  inseam: { more: [{ correction: 'lengthen-leg', share: 1 }], less: [{ correction: 'shorten-leg', share: 1 }] },
}; // prettier-ignore
