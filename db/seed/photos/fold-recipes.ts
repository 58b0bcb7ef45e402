import type { FigureView } from '@/diagnosis/figure/figure';

export type FoldKind = 'tight' | 'slack' | 'gap';

/** Level down the garment, and fraction across it: centre 0 to side seam 1 (negative: the other side), or front 0 to back 1. */
export type Place = readonly [v: number, across: number];

export type FoldPath = {
  readonly kind: FoldKind;
  /** Half width of the fold, in crotch depths. */
  readonly width: number;
  readonly places: readonly Place[];
  /** Drawn once on each side, or once over both. */
  readonly sided: boolean;
};

const tight = (...places: Place[]): FoldPath => ({ kind: 'tight', width: 0.03, places, sided: true });
const slack = (width: number, ...places: Place[]): FoldPath => ({
  kind: 'slack',
  width,
  places,
  sided: true,
});
const acrossBoth = (path: FoldPath): FoldPath => ({ ...path, sided: false });

const FORK_FAN = [
  tight([0.97, 0.05], [0.86, 0.25], [0.74, 0.5], [0.66, 0.68]),
  tight([0.99, 0.07], [0.93, 0.3], [0.86, 0.55], [0.82, 0.76]),
  tight([0.93, 0.04], [0.78, 0.15], [0.6, 0.28], [0.48, 0.36]),
];
const INNER_THIGH_PULL = [
  tight([1.03, 0.05], [1.12, 0.22], [1.22, 0.42], [1.29, 0.56]),
  tight([1.05, 0.04], [1.2, 0.16], [1.36, 0.3], [1.47, 0.4]),
  tight([1.01, 0.08], [1.05, 0.3], [1.1, 0.52], [1.13, 0.66]),
];
const HIP_LINES = [0.6, 0.69, 0.77].map((v, index) =>
  acrossBoth(tight([v - 0.02, -0.94 + 0.05 * index], [v + 0.02, -0.45], [v + 0.03, 0], [v + 0.02, 0.45], [v - 0.02, 0.94 - 0.03 * index])),
); // prettier-ignore
const HEM_DRAG = [
  slack(0.05, [3.3, 0.12], [3.36, 0.45], [3.3, 0.85]),
  slack(0.045, [3.42, 0.1], [3.49, 0.5], [3.45, 0.9]),
  slack(0.04, [3.15, 0.3], [3.2, 0.6], [3.17, 0.85]),
];

/** Where the cloth folds in each view for common readings of a pair of trousers. Directions as a fitter would draw them. */
export const FOLD_RECIPES = {
  'tight-from-front-fork': { front: FORK_FAN },
  'pull-into-inner-thigh': { front: INNER_THIGH_PULL, back: INNER_THIGH_PULL },
  'tight-across-hip': {
    front: HIP_LINES,
    back: HIP_LINES,
    left: [0.6, 0.7, 0.79].map((v) => tight([v - 0.02, 0.08], [v + 0.015, 0.5], [v - 0.01, 0.9])),
    right: [0.6, 0.7, 0.79].map((v) => tight([v - 0.02, 0.08], [v + 0.015, 0.5], [v - 0.01, 0.9])),
  },
  'slack-vertical-front-thigh': {
    front: [
      slack(0.06, [0.95, 0.34], [1.2, 0.36], [1.55, 0.4], [1.85, 0.42]),
      slack(0.055, [0.88, 0.58], [1.2, 0.6], [1.5, 0.6], [1.78, 0.6]),
    ],
  },
  'slack-from-front-fork': {
    front: [
      slack(0.05, [0.9, 0.06], [0.98, 0.25], [1.04, 0.45]),
      slack(0.045, [0.78, 0.05], [0.84, 0.25], [0.87, 0.46]),
    ],
  },
  'slack-under-seat': {
    back: [
      slack(0.055, [1.02, 0.14], [1.1, 0.42], [1.07, 0.8]),
      slack(0.05, [1.16, 0.1], [1.24, 0.42], [1.17, 0.82]),
      slack(0.045, [1.3, 0.12], [1.39, 0.4], [1.31, 0.72]),
    ],
    left: [slack(0.05, [1.0, 0.94], [1.08, 0.72], [1.12, 0.5]), slack(0.045, [1.16, 0.92], [1.25, 0.7], [1.28, 0.52])],
    right: [slack(0.05, [1.0, 0.94], [1.08, 0.72], [1.12, 0.5]), slack(0.045, [1.16, 0.92], [1.25, 0.7], [1.28, 0.52])],
  },
  'fold-under-back-band': {
    back: [
      acrossBoth(slack(0.05, [0.19, -0.74], [0.23, -0.35], [0.24, 0], [0.23, 0.35], [0.19, 0.74])),
      acrossBoth(slack(0.04, [0.32, -0.46], [0.355, 0], [0.32, 0.46])),
    ],
    left: [slack(0.045, [0.22, 0.95], [0.23, 0.75], [0.21, 0.55])],
    right: [slack(0.045, [0.22, 0.95], [0.23, 0.75], [0.21, 0.55])],
  },
  'drawn-in-centre-back': {
    back: [
      acrossBoth({ kind: 'tight', width: 0.045, places: [[0.62, 0], [0.76, 0], [0.9, 0], [1, 0]], sided: false }),
      tight([0.9, 0.05], [0.83, 0.26], [0.76, 0.5], [0.72, 0.66]),
      tight([0.97, 0.06], [0.94, 0.3], [0.91, 0.55]),
      tight([0.8, 0.05], [0.7, 0.2], [0.62, 0.36]),
    ],
  },
  'gaping-waist-back': {
    back: [
      acrossBoth({ kind: 'gap', width: 0.06, places: [[0, -0.62], [0, -0.3], [0, 0], [0, 0.3], [0, 0.62]], sided: false }),
    ],
  },
  'hem-dragging': { front: HEM_DRAG, back: HEM_DRAG, left: HEM_DRAG, right: HEM_DRAG },
  'slack-behind-knee': { back: [slack(0.045, [2.05, 0.2], [2.12, 0.5], [2.06, 0.8]), slack(0.045, [2.2, 0.2], [2.27, 0.5], [2.2, 0.8])] },
  'back-band-pulled-down': {
    seated: [
      tight([0.14, 0.92], [0.3, 0.86], [0.5, 0.84], [0.66, 0.82]),
      tight([0.16, 0.74], [0.34, 0.68], [0.55, 0.64], [0.72, 0.66]),
    ],
  },
  'slack-in-lap': {
    seated: [
      slack(0.05, [0.5, 0.06], [0.6, 0.2], [0.68, 0.36]),
      slack(0.045, [0.7, 0.05], [0.76, 0.22], [0.84, 0.38]),
    ],
  },
} as const satisfies Record<string, Partial<Record<FigureView, readonly FoldPath[]>>>; // prettier-ignore

export type FoldSignId = keyof typeof FOLD_RECIPES;
