import type { Sign } from '../../schema';

export const BACK_AND_SIDES: Sign['views'] = ['back', 'left', 'right'];
export const FRONT_AND_SIDES: Sign['views'] = ['front', 'left', 'right'];
export const SIDES: Sign['views'] = ['left', 'right'];
export const STANDING: Sign['views'] = ['front', 'back', 'left', 'right'];

/** A leg caught by the thigh holds the fork down and stretches what hangs (fitter's reference 1.6: TC022, TC036, TC040, TC081). */
export const TIGHT_THIGH: Sign['maskedBy'] = [
  { to: 'front-thigh', direction: 'more' },
  { to: 'back-thigh', direction: 'more' },
];
/** A hip too narrow pulls spare width and spare length flat. */
export const TIGHT_HIP: Sign['maskedBy'] = [
  { to: 'hip-back', direction: 'more' },
  { to: 'hip-front', direction: 'more' },
];
