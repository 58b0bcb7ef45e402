import type { LookAlikeGroup } from '@/diagnosis/evaluation/look-alikes';

const less = (dimension: string) => ({ dimension, direction: 'less' as const });
const more = (dimension: string) => ({ dimension, direction: 'more' as const });
const cause = (id: string) => ({ cause: id });

/** One sign or more at clear, the waist on its mark and the curve trimmed unless the group is about them. */
function signs(...ids: string[]): LookAlikeGroup['case'] {
  return {
    garment: 'trousers',
    signs: ids.map((sign) => ({ sign, severity: 2 })),
    causes: { absent: ['not-at-level', 'curve-allowance-untrimmed'] },
  };
}

/** The fourteen hardest look-alikes and the cheapest tests on the body, in the order in which they are done. */
export const lookAlikes: LookAlikeGroup[] = [
  {
    row: 1,
    name: 'folds under the seat',
    case: signs('slack-under-seat'),
    steps: [
      { check: 'rock-the-pelvis', outcomes: [{ outcome: 'leave', shows: [cause('stance')] }], goOn: 'stay' },
      { check: 'shake-the-leg', outcomes: [{ outcome: 'leave', shows: [more('calf-girth')] }], goOn: 'stay' },
      { check: 'lift-band-all-round', outcomes: [{ outcome: 'both-clear', shows: [less('crotch-depth')] }], goOn: 'do-not-clear' },
      { check: 'lift-band-behind', outcomes: [{ outcome: 'clear', shows: [less('back-rise'), less('back-slope')] }], goOn: 'do-not-clear' },
      { check: 'pinch-back-thigh', outcomes: [{ outcome: 'clears', shows: [less('back-thigh')] }], goOn: 'stays' },
      { check: 'hand-below-seat', outcomes: [{ outcome: 'hollow', shows: [more('back-curve')] }] },
    ],
  },
  {
    row: 2,
    name: 'taut lines rising from the front fork',
    case: { garment: 'trousers', signs: [{ sign: 'taut-lines-rising-from-front-fork', severity: 2 }] },
    steps: [
      { check: 'curve-trimmed', outcomes: [{ outcome: 'untrimmed', shows: [cause('curve-allowance-untrimmed')] }], goOn: 'trimmed' },
      { check: 'let-band-down-in-front', outcomes: [{ outcome: 'ease', shows: [more('front-rise'), more('crotch-depth')] }, { outcome: 'unchanged', shows: [more('front-extension')] }] },
    ],
  },
  {
    row: 3,
    name: 'low crotch in stretch',
    case: { ...signs('fork-hangs-low'), cloth: { kind: 'knit', stretchPercent: 40 } },
    steps: [
      { check: 'pull-legs-up', outcomes: [{ outcome: 'drops-back', shows: [more('front-thigh'), more('back-thigh')] }, { outcome: 'stays-loose', shows: [less('crotch-depth')] }], goOn: 'drops-back' },
      { check: 'open-side-of-leg', outcomes: [{ outcome: 'rises', shows: [more('front-thigh'), more('back-thigh')] }] },
    ],
  },
  {
    row: 4,
    name: 'the back waist gapes or drops',
    case: signs('waist-gapes-behind'),
    steps: [
      { check: 'sit-and-mark-band', outcomes: [{ outcome: 'over-15-mm', shows: [more('back-rise')] }], goOn: 'up-to-15-mm' },
      { check: 'gap-standing-and-sitting', outcomes: [{ outcome: 'same', shows: [less('waist-back')] }], goOn: 'same' },
      { check: 'band-edges', outcomes: [{ outcome: 'top-edge-off', shows: [more('waistband-contour')] }] },
    ],
  },
  {
    row: 5,
    name: 'a fold under the back band',
    case: signs('fold-under-back-band'),
    steps: [
      { check: 'open-side-at-hip', outcomes: [{ outcome: 'flat', shows: [more('hip-back')] }], goOn: 'stays' },
      { check: 'pin-fold-under-band', outcomes: [{ outcome: 'easy', shows: [less('back-rise')] }] },
    ],
  },
  {
    row: 6,
    name: 'seat drawn into the cleft',
    case: signs('seat-drawn-in-at-centre-back'),
    steps: [
      { check: 'slide-band-down-behind', outcomes: [{ outcome: 'relief', shows: [more('back-rise')] }, { outcome: 'no-relief', shows: [more('back-extension'), more('hip-back')] }], goOn: 'no-relief' },
      { check: 'hip-lines-or-smooth', outcomes: [{ outcome: 'lines', shows: [more('hip-back')] }, { outcome: 'smooth', shows: [more('back-extension')] }], goOn: 'smooth' },
      { check: 'worse-only-sitting', outcomes: [{ outcome: 'only-sitting', shows: [more('back-slope')] }] },
    ],
  },
  {
    row: 7,
    name: 'slack in front',
    case: signs('fold-at-centre-front'),
    steps: [
      { check: 'elastic-at-waist', outcomes: [{ outcome: 'gone', shows: [less('waist-front')] }], goOn: 'stays' },
      { check: 'pin-fold-at-centre-front', outcomes: [{ outcome: 'clear', shows: [less('front-rise')] }, { outcome: 'runs-past', shows: [less('crotch-depth')] }], goOn: 'no' },
      { check: 'pinch-front-hip', outcomes: [{ outcome: 'clears', shows: [less('hip-front')] }] },
    ],
  },
  {
    row: 8,
    name: 'pockets gape',
    case: signs('pockets-gape'),
    steps: [
      { check: 'pin-pocket-shut', outcomes: [{ outcome: 'smooth', shows: [cause('pocket-without-stay')] }, { outcome: 'lines', shows: [more('hip-front'), more('hip-back')] }] },
    ],
  },
  {
    row: 9,
    name: 'the fork cuts though the depth measures right',
    case: { ...signs('fork-cuts'), measured: [{ terms: [{ dimension: 'crotch-depth' }], needMm: 0, sdMm: 6 }] },
    steps: [{ check: 'open-side-waist', outcomes: [{ outcome: 'drops', shows: [more('waist-front'), more('waist-back')] }] }],
  },
  {
    row: 10,
    name: 'a diagonal from the inner hem to the front knee',
    case: signs('diagonal-from-inner-hem-to-front-knee'),
    steps: [
      { check: 'feet-apart', outcomes: [{ outcome: 'clears', shows: [more('leg-swing')] }], goOn: 'stays' },
      { check: 'shake-the-leg', outcomes: [{ outcome: 'leave', shows: [more('calf-girth')] }] },
    ],
  },
  {
    row: 11,
    name: 'the side seam off plumb',
    case: signs('side-seam-swings-forward'),
    steps: [{ check: 'grain-plumb', outcomes: [{ outcome: 'spirals', shows: [cause('off-grain')] }, { outcome: 'both-lean', shows: [more('side-rise')] }, { outcome: 'plumb', shows: [more('hip-front')] }] }],
  },
  {
    row: 12,
    name: 'folds on one side',
    case: {
      ...signs(),
      signs: [{ sign: 'one-side-waist-low', severity: 2, side: 'left' }],
    },
    steps: [
      { check: 'empty-pockets', outcomes: [{ outcome: 'gone', shows: [cause('layers-or-pocket-contents')] }], goOn: 'still-there' },
      { check: 'card-under-heel', outcomes: [{ outcome: 'clears', shows: [less('side-rise')] }], goOn: 'stays' },
      { check: 'inside-out', outcomes: [{ outcome: 'changes-side', shows: [cause('not-sewn-as-planned')] }] },
    ],
  },
  {
    row: 13,
    name: 'a hem long standing, short sitting',
    case: signs('hem-folds-on-shoe'),
    steps: [
      { check: 'stand-up-again', outcomes: [{ outcome: 'stays-up', shows: [more('calf-girth')] }, { outcome: 'crawls-then-falls', shows: [more('back-extension')] }, { outcome: 'falls', shows: [less('leg-length')] }] },
    ],
  },
  {
    row: 14,
    name: 'lines on the thigh',
    // Faint lines that may be either: taut across, or standing upright.
    case: {
      ...signs(),
      signs: [
        { sign: 'tight-lines-front-thigh', severity: 1 },
        { sign: 'vertical-slack-front-thigh', severity: 1 },
      ],
    },
    steps: [
      { check: 'pinch-front-thigh', outcomes: [{ outcome: 'no', shows: [more('front-thigh')] }, { outcome: 'yes', shows: [more('crotch-depth'), more('front-extension')], also: ['taut-lines-rising-from-front-fork'] }, { outcome: 'yes-loose', shows: [less('front-thigh')] }] },
    ],
  },
]; // prettier-ignore
