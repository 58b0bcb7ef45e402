/** Why the vector of a correction and the drawn paper part by more than a tenth: by correction, then by paper sum. */
type Differences = Readonly<Record<string, Readonly<Record<string, string>>>>;

const LEAN_FOLLOWS =
  'A wedge turns everything above it, so that the centre leans as well; the instructions true the centre straight again.';
const RAISED_ALONG =
  'The waist is raised along a leaning centre, so that its end moves toward the side; the band is walked afterwards.';
const WAIST_ASLANT = 'A waist that is raised at one end runs more aslant; the band is walked afterwards.';
const DART_STAYS =
  "The dart's mouth rises with the waist and its point stays where the body is fullest: redraw it, or lengthen it as the instructions say.";
const SIDE_TURNED =
  'The slash runs a little downhill to the centre, so that the turned side ends a little higher.';
const BODY_EFFECT =
  'Not drawn but felt: a narrower hip takes length from the seam through the fork. It is learnt on the body, not on the paper.';
const ABOVE_NOTCH =
  'The seam above the notch is kept; the fork itself moves, and the curve gains the length.';
const FORK_MOVES = 'The thigh is measured at a height that the moved fork passes.';
const LOW_SEAT =
  'The loss is at the low seat, where the curve is cut, not at the hip line that this sum measures.';
const SIDE_KEPT =
  'The side keeps its length along the seam, so that its end sinks or rises as it leans less or more.';
const OVER_THE_FRONT =
  'The side moves at that height too, so that the width over the front goes with it, in part.';
const NOT_AT_25 =
  'The width is taken from 60 mm below the point, since a seam cannot turn within 25 mm; at 25 mm little of it is there.';
const ALL_THE_WAY = 'A spread or tuck that runs from waist to hem changes every width on its way.';
const CENTRE_LINE = 'Only one half of the leg moves, so that its middle moves by half.';
const SEAM_TILTS = 'The centre tilts, so that it is longer or shorter at the same height.';
const BELOW_THE_HIP = 'The leg is shifted from the fork on, and a little of it is there at the thigh.';
const CALF_HEIGHT =
  'A straight line from knee to hem passes this block at a third of the way down: a third of the amount, not a half.';
const SHAPING_MOVES = 'The taper of the lower leg moves with the knee.';

const TRUED =
  'The side is trued across the gap or the fold, and a tenth of the amount is gained or lost in its round.';
const FRONT_SEAM = 'centre front, waist to notch';
const BACK_SEAM = 'centre back, waist to notch';
const OVER_FRONT = 'width over the front';
const bothSeams = (why: string) => ({ [FRONT_SEAM]: why, [BACK_SEAM]: why });
const widths = (waist: string) => ({
  [waist]: ALL_THE_WAY,
  knee: ALL_THE_WAY,
  calf: ALL_THE_WAY,
  hem: ALL_THE_WAY,
});
const thighs = (why: string) => ({ 'front thigh': why, 'back thigh': why });
const HALF_LEG = {
  'middle of the leg at the hem': CENTRE_LINE,
  'middle of the leg at the knee': CENTRE_LINE,
};
const TWIST_FRONT = { 'hem of the back against the front': ALL_THE_WAY };
const WEDGE = { 'lean of centre back': LEAN_FOLLOWS };
const FORK_LEVEL = { ...bothSeams(ABOVE_NOTCH), ...thighs(FORK_MOVES) };
const SIDE_HEIGHTS = { 'side waist above the fork': SIDE_KEPT, 'side waist above the hem': SIDE_KEPT };
const KNEE_LINE = { calf: SHAPING_MOVES };

export const DIFFERENCES: Differences = {
  'lengthen-depth': { 'round of the side above the hip': TRUED },
  'shorten-depth': { [OVER_FRONT]: TRUED },
  'raise-centre-back': { 'lean of centre back': RAISED_ALONG, 'length of the back dart': DART_STAYS },
  'wedge-into-back': WEDGE,
  'pin-out-back-fold': WEDGE,
  'overlap-wedge-in-back': WEDGE,
  'tip-waist-forward': {
    'lean of centre back': RAISED_ALONG,
    'front waist': WAIST_ASLANT,
    'back waist': WAIST_ASLANT,
    'length of the back dart': DART_STAYS,
  },
  'raise-centre-front': { 'front waist': WAIST_ASLANT },
  'lower-centre-front': { 'front waist': WAIST_ASLANT },
  'wedge-into-front': {
    'side waist above the fork': SIDE_TURNED,
    'side waist above the hem': SIDE_TURNED,
    'lean of centre front': LEAN_FOLLOWS,
  },
  'raise-side-waist': {
    'front waist': WAIST_ASLANT,
    'back waist': WAIST_ASLANT,
    [OVER_FRONT]: OVER_THE_FRONT,
    'length of the back dart': DART_STAYS,
  },
  'lower-side-waist': {
    'back waist': WAIST_ASLANT,
    [OVER_FRONT]: OVER_THE_FRONT,
    'length of the back dart': DART_STAYS,
  },
  'lower-crotch-level': FORK_LEVEL,
  'raise-crotch-level': FORK_LEVEL,
  'hollow-back-curve': { 'back hip': LOW_SEAT },
  'fill-back-curve': { 'back hip': LOW_SEAT },
  'more-front-slope': SIDE_HEIGHTS,
  'less-front-slope': SIDE_HEIGHTS,
  'let-out-hip-side': { [OVER_FRONT]: OVER_THE_FRONT },
  'take-in-hip-side': { ...bothSeams(BODY_EFFECT), [OVER_FRONT]: OVER_THE_FRONT },
  'let-out-centre-back': { [BACK_SEAM]: SEAM_TILTS },
  'take-in-centre-back': { [BACK_SEAM]: SEAM_TILTS, 'lean of centre back': SEAM_TILTS },
  'spread-back': { ...widths('back waist'), ...TWIST_FRONT },
  'narrow-back': { ...widths('back waist'), ...TWIST_FRONT },
  'spread-front': { ...widths('front waist'), ...HALF_LEG, ...TWIST_FRONT },
  'narrow-front': { ...widths('front waist'), ...HALF_LEG, ...TWIST_FRONT },
  'round-out-side': { [OVER_FRONT]: OVER_THE_FRONT },
  'flatten-side': { [OVER_FRONT]: OVER_THE_FRONT },
  'let-out-waist-front': { [OVER_FRONT]: OVER_THE_FRONT },
  'take-in-waist-front': { [OVER_FRONT]: OVER_THE_FRONT },
  'take-in-back-inseam': { 'back thigh': NOT_AT_25 },
  'let-out-back-inseam': { 'back thigh': NOT_AT_25 },
  'shift-leg-in': thighs(BELOW_THE_HIP),
  'shift-leg-out': thighs(BELOW_THE_HIP),
  'let-out-hem': { calf: CALF_HEIGHT },
  'take-in-hem': { calf: CALF_HEIGHT },
  'lower-knee-line': KNEE_LINE,
  'raise-knee-line': KNEE_LINE,
  'bring-side-seam-forward': { 'middle of the leg at the hem': CENTRE_LINE },
  'bring-side-seam-back': { 'middle of the leg at the hem': CENTRE_LINE },
};
