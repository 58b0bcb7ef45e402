import type { CaseInput } from '@/diagnosis/case-schema';
import type { PublishedCase } from '@/diagnosis/evaluation/published';

/**
 * Worked cases from print, mapped to signs once, before any strength was fitted. What print does not say is not mapped:
 * a sign is there at clear (2) unless print gives its degree, absent only where print says so. The makers had trimmed the
 * curve and set the waist on its mark unless they say otherwise, so those two causes are crossed off.
 */
const SETTLED = { absent: ['curve-allowance-untrimmed', 'not-at-level'] };

type Extra = Omit<CaseInput, 'garment'> & { doubtful?: boolean };

function tuning(
  id: string,
  source: string,
  signs: Record<string, number>,
  accept: string[],
  why: string,
  { doubtful, ...extra }: Extra = {},
): PublishedCase {
  return {
    id: `trousers:${id}`,
    source: `trousers:${source}`,
    tuning: true,
    case: {
      garment: 'trousers',
      causes: SETTLED,
      signs: Object.entries(signs).map(([sign, severity]) => ({ sign, severity })),
      ...extra,
    },
    accept,
    why,
    doubtful,
  };
}

/** A case that print leaves unsolved, or names no change for: what is asked of it is doubt or a test, never an answer. */
const unsolved = (
  id: string,
  source: string,
  signs: Record<string, number>,
  why: string,
  extra: Extra = {},
): PublishedCase => ({
  ...tuning(id, source, signs, [], why, { ...extra, doubtful: true }),
  tuning: false,
});

const BACK_RISE_UP = ['raise-centre-back', 'wedge-into-back'];
const FRONT_RISE_UP = ['raise-centre-front', 'wedge-into-front'];
const HIP_OUT = ['let-out-hip-side', 'let-out-centre-back', 'spread-back'];

export const publishedCases: PublishedCase[] = [
  tuning('TC007', 'S02', { 'diagonal-from-inner-hem-to-front-knee': 2 }, ['swing-leg-in'], 'The fold is taken along the inseam toward the hem: the hem moves inward.'),
  tuning('TC008', 'S02', { 'hem-folds-on-shoe': 2, 'hem-lifts-when-sitting': 2, 'hem-lifts-at-each-step': 2 }, ['extend-back-point', 'extend-front-point'], 'The fork is enlarged; the hem is not cut.'),
  tuning('TC009', 'S02', { 'waist-stands-off-in-front': 2, 'hem-drags-behind': 2, 'diagonal-from-inner-hem-to-front-knee': 2 }, ['take-in-waist-front'], 'Surplus comes out of the front waist.'),
  tuning('TC010', 'S02', { 'slack-under-seat': 2, 'slack-lines-falling-from-back-fork': 2 }, ['less-back-slope'], 'Less slope, or none for somebody who sits.', { absent: ['seat-drawn-in-at-centre-back'] }),
  tuning('TC011', 'S02', { 'fork-cuts': 2, 'tight-at-side-above-hip': 2 }, ['round-out-side', 'let-out-waist-front', 'let-out-waist-back'], 'Width at the side above the seat line.', { shape: ['full-at-side-waist'] }),
  tuning('TC012', 'S02', { 'tight-lines-below-front-waist': 2, 'centre-fronts-do-not-meet': 2 }, ['spread-front', 'let-out-waist-front', 'wedge-into-front'], 'Add at front and side, leave the back.', { shape: ['rounded-front', 'waist-as-wide-as-hip'] }),
  tuning('TC017', 'S10', { 'waist-falls-when-sitting': 2, 'waist-gapes-behind': 1 }, BACK_RISE_UP, 'Lengthen the back rise.'),
  tuning('TC018', 'S10', { 'upright-pleat-at-centre-back': 2 }, ['deepen-back-dart', 'lengthen-back-dart', 'take-in-centre-back'], 'Balance the dart: the pleat at centre back is spare waist.'),
  tuning('TC022', 'S64', { 'fork-hangs-low': 2, 'fold-at-centre-front': 2, 'slack-under-seat': 2 }, ['shorten-depth'], 'A tuck across front and back.'),
  tuning('TC023', 'S64', { 'fold-at-centre-front': 2, 'slack-under-seat': 1 }, ['lower-centre-front', ...BACK_RISE_UP, 'shorten-depth'], 'Print undoes the front change and alters the back length apart: it stays open which.', { doubtful: true }),
  tuning('TC024', 'S64', { 'vertical-slack-front-thigh': 2, 'vertical-slack-back-thigh': 2 }, ['take-in-thigh-side'], 'Re-pin the side seam: too much thigh width.'),
  tuning('TC026', 'S66', { 'waist-falls-when-sitting': 1, 'taut-lines-from-back-fork-to-seat': 1 }, [...BACK_RISE_UP, 'hollow-back-curve', 'lengthen-depth'], 'Raise the waist, scoop the back curve.', { shape: ['low-seat', 'long-between-waist-and-seat'] }),
  tuning('TC027', 'S66', { 'fork-hangs-low': 2 }, ['shorten-depth'], 'Shorten the rise well.', { shape: ['high-round-seat', 'short-between-waist-and-seat'] }),
  tuning('TC028', 'S67', { 'fold-at-centre-front': 3, 'band-slides-down': 2 }, ['lower-centre-front', 'take-in-waist-front'], 'Lower the front waist nearly 50 mm, take in the waist.', { shape: ['waist-lower-in-front'] }),
  tuning('TC030', 'S67', { 'u-folds-under-seat': 2 }, ['hollow-back-curve'], 'Scoop the back curve; taking the seat in had left the folds.', { absent: ['vertical-slack-seat'], shape: ['low-seat'] }),
  tuning('TC031', 'S67', { 'fold-at-centre-front': 2 }, ['lower-centre-front'], 'Overlap the front, back untouched.', { shape: ['waist-lower-in-front'] }),
  tuning('TC032', 'S67', { 'fold-at-centre-front': 1, 'vertical-slack-front-hip': 2 }, ['narrow-front', 'take-in-hip-side', 'lower-centre-front'], 'Width folded out, front then only slightly loose.', { cloth: { kind: 'knit', stretchPercent: 30 } }),
  tuning('TC040', 'S73', { 'fork-hangs-low': 3, 'tight-lines-front-thigh': 2, 'tight-lines-back-thigh': 2 }, ['let-out-thigh-side'], 'Strips inserted at the side of too narrow legs; the crotch rose to its place.', { cloth: { kind: 'knit', stretchPercent: 50 } }),
  tuning('TC042', 'S75', { 'fork-hangs-low': 2, 'hem-will-not-pass-foot': 2 }, ['let-out-calf', 'let-out-thigh-side', 'shorten-depth'], 'Crotch and ankle redrawn.', { cloth: { kind: 'knit', stretchPercent: 50 } }),
  tuning('TC046', 'S79', { 'pockets-gape': 2 }, ['pocket-without-stay', ...HIP_OUT], 'A stay for the pocket; others would let out the hip.', { tests: [{ check: 'pin-pocket-shut', outcome: 'smooth' }] }),
  tuning('TC047', 'S80', { 'fold-at-centre-front': 3, 'band-slides-down': 2 }, ['lower-centre-front', 'take-in-waist-front'], 'Front length and waist both taken out.'),
  tuning('TC050', 'S82', { 'tight-lines-front-thigh': 2, 'tight-lines-back-thigh': 2 }, ['let-out-thigh-side'], 'Add at the thigh on both seams.', { shape: ['strong-front-thigh'] }),
  tuning('TC051', 'S82', { 'tight-lines-back-thigh': 1, 'leg-twists-round': 1, 'taut-lines-from-back-fork-to-seat': 2 }, ['let-out-thigh-side', 'extend-back-point', ...BACK_RISE_UP], 'Add at the side seams and to the back crotch length.', { causes: { absent: [...SETTLED.absent, 'off-grain'] } }),
  tuning('TC052', 'S82', { 'loose-below-full-thigh': 2 }, ['take-in-thigh-side'], 'Take the seam in below the fullest point.', { shape: ['strong-front-thigh'] }),
  tuning('TC053', 'S82', { 'vertical-slack-seat': 1, 'waist-gapes-behind': 2 }, ['take-in-centre-back', 'deepen-back-dart'], 'Take in along the centre back.'),
  tuning('TC055', 'S84', { 'vertical-slack-seat': 2, 'band-slides-down': 2 }, ['take-in-centre-back', 'take-in-hip-side', 'lower-centre-front', 'raise-centre-back'], 'A smaller size; front down, back up.', { shape: ['hollow-above-seat'] }),
  tuning('TC056', 'S85', { 'fork-cuts': 2, 'split-line-at-front-fork': 2 }, ['lengthen-depth', ...FRONT_RISE_UP, 'fill-front-curve'], 'Raise the rise; the curve shallower.', { shape: ['long-between-waist-and-seat'] }),
  tuning('TC057', 'S86', { 'vertical-slack-seat': 2, 'slack-under-seat': 2, 'vertical-slack-back-thigh': 2 }, ['pin-out-back-fold', 'shorten-depth', 'take-in-back-inseam', 'take-in-thigh-side'], 'Lower the back waist, less depth, narrower upper leg.', { shape: ['shallow-seat'] }),
  tuning('TC058', 'S86', { 'waist-falls-when-sitting': 3 }, [...BACK_RISE_UP, 'shape-under-seat'], 'Elastic in the yoke holds up what the back rise lacks; a seam under the seat.', { shape: ['shallow-seat'] }),
  tuning('TC059', 'S87', { 'taut-lines-from-seat-to-calf': 2 }, ['shape-under-seat', 'shorten-behind-knee', 'let-out-calf'], 'A seam down the back leg, shaped under the seat, at knee and calf.', { shape: ['low-seat', 'knees-pressed-back', 'strong-calf'] }),
  tuning('TC061', 'S89', {}, ['lower-side-waist', 'shorten-depth', 'stance'], 'One side only, left as it was: print does not correct it.', { doubtful: true, shape: ['right-hip-higher'], signs: [{ sign: 'fold-under-one-half-of-seat', severity: 2, side: 'left' }] }),
  tuning('TC062', 'S89', { 'seat-drawn-in-at-centre-back': 2, 'taut-lines-from-back-fork-to-seat': 2 }, ['extend-back-point', 'hollow-back-curve', ...BACK_RISE_UP], 'A longer back crotch with the body’s own curve.'),
  tuning('TC063', 'S90', { 'level-fold-all-round-below-waist': 2 }, ['shorten-depth', 'pin-out-back-fold', 'lower-centre-front'], 'Pleat the height above the seat line, front and back.', { absent: ['slack-under-seat', 'tight-lines-across-back-hip', 'tight-lines-across-front-hip'], shape: ['short-between-waist-and-seat'] }),
  tuning('TC070', 'S32', { 'slack-under-seat': 2 }, ['stance'], 'Rotating the pelvis clears the folds.', { shape: ['hips-forward'], tests: [{ check: 'rock-the-pelvis', outcome: 'leave' }] }),
  tuning('TC073', 'S34', { 'waist-low-all-round': 2, 'fork-cuts': 2 }, ['lengthen-depth', ...BACK_RISE_UP, ...FRONT_RISE_UP], 'Raise front and back rise.'),
  tuning('TC074', 'S34', { 'waist-high-all-round': 2 }, ['shorten-depth'], 'Lower both rises.'),
  tuning('TC075', 'S34', { 'waist-dips-in-front': 2, 'upright-taut-lines-beside-front-fork': 2 }, FRONT_RISE_UP, 'Raise the front rise.'),
  tuning('TC076', 'S34', { 'waist-high-in-front': 2 }, ['lower-centre-front'], 'Lower the front rise.', { shape: ['band-below-rounded-front'] }),
  tuning('TC077', 'S23', { 'slack-lines-falling-from-front-fork': 2 }, ['shorten-front-point'], 'Width off at the front inseam top.'),
  tuning('TC078', 'S23', { 'taut-lines-rising-from-front-fork': 2 }, ['extend-front-point'], 'Width added at the front inseam top.'),
  tuning('TC079', 'S23', { 'upright-taut-lines-beside-front-fork': 2 }, ['deepen-front-curve'], 'Deepen the curve (inferred).'),
  tuning('TC080', 'S20', { 'taut-lines-rising-from-front-fork': 2 }, ['lengthen-depth', ...FRONT_RISE_UP], 'Length above the crotch; print reads the same lines as others read a short point.', { doubtful: true }),
  tuning('TC082', 'S38', { 'pockets-gape': 2, 'tight-lines-across-back-hip': 1 }, HIP_OUT, 'Let out the back seam.', { absent: ['waist-gapes-behind'] }),
  tuning('TC083', 'S94', { 'waist-falls-when-sitting': 3 }, BACK_RISE_UP, 'A strip across the back under the elastic.'),
  tuning('TC084', 'S95', { 'fold-at-centre-front': 1, 'leg-loose-all-round': 3, 'loose-folds-at-inner-thigh': 2 }, ['take-in-back-inseam', 'take-in-thigh-side', 'shorten-back-point', 'shorten-front-point'], 'Take in the legs, chiefly the inner thigh.', { cloth: { kind: 'stretch-woven', stretchPercent: 20 } }),
  tuning('TC087', 'S98', { 'side-seam-strained-open': 3 }, ['stretch-the-wrong-way'], 'Recut across the stretch.', { cloth: { kind: 'stretch-woven', stretchPercent: 25 }, causes: { present: ['stretch-the-wrong-way'], absent: SETTLED.absent } }),
  tuning('TC088', 'S99', { 'loose-folds-at-inner-thigh': 2, 'slack-lines-falling-from-back-fork': 1 }, ['shorten-back-point'], 'The wedge cut out of the back crotch.'),
  tuning('TC089', 'S100', { 'fold-at-centre-front': 2, 'leg-loose-all-round': 2 }, ['lower-centre-front', 'take-in-thigh-side', 'narrow-front'], 'Front depth out at centre front to nothing, leg width reduced.'),
  tuning('TC091', 'S110', { 'will-not-come-over-hip': 3, 'tight-lines-across-back-hip': 2, 'tight-lines-across-front-hip': 2 }, ['let-out-hip-side', 'spread-back', 'spread-front', 'let-out-centre-back'], 'Let all seams out at the hip.', { muslin: 'shorts' }),
  tuning('TC095', 'S113', { 'taut-lines-rising-from-front-fork': 2, 'seat-drawn-in-at-centre-back': 3 }, ['lengthen-depth', ...BACK_RISE_UP, ...FRONT_RISE_UP], 'Split front and back at the hip line and spread.'),
  { ...tuning('TC006', 'S04', { 'slack-lines-falling-from-front-fork': 2 }, ['shorten-front-point'], 'Spare cloth at the fork; print names no change, so it is not tuned on.'), tuning: false },
  unsolved('TC005', 'S04', { 'taut-lines-under-rounded-front': 2 }, 'The same family of lines as a short front rise or a tight front thigh; the remedy is not in the excerpt.', { shape: ['rounded-front'] }),
  unsolved('TC029', 'S67', { 'level-folds-down-back-leg': 3 }, 'Eight alterations at once and a lining added: cloth, lining and transfer cannot be told apart.', { absent: ['side-seam-swings-forward', 'side-seam-swings-back', 'taut-lines-rising-from-front-fork'] }),
  unsolved('TC036', 'S70', { 'seat-drawn-in-at-centre-back': 3 }, 'Too wide and too short looked alike, and no allowance was left to tell them apart.'),
  unsolved('TC044', 'S77', { 'tight-lines-across-front-hip': 2, 'tight-lines-across-back-hip': 2, 'tight-lines-front-thigh': 2 }, 'One pattern, two cloths, two verdicts.', { cloth: { kind: 'stretch-woven', stretchPercent: 15 }, muslin: 'shorts' }),
  unsolved('TC048', 'S80', { 'level-folds-down-back-leg': 1 }, 'Seen in photographs, not in the mirror: stance, or unresolved.'),
  unsolved('TC054', 'S83', { 'level-folds-down-back-leg': 2, 'slack-under-seat': 1, 'bagged-in-wear': 1 }, 'Three causes listed by the maker, none tested.', { shape: ['low-seat'] }),
  unsolved('TC064', 'S91', { 'fork-hangs-low': 3 }, 'A crotch line lowered where the hip line should have been raised; perhaps measured wrongly.'),
  unsolved('TC081', 'S93', { 'tight-wrinkles-under-back-band': 2, 'seat-drawn-in-at-centre-back': 2, 'hem-lifts-at-each-step': 1, 'pocket-bags-show-through': 2 }, 'Four signs of one tight seat; the remedy is not in the excerpt.'),
  unsolved('TC086', 'S97', { 'side-seam-swings-forward': 2 }, 'Unknown; cut on grain by the maker.', { causes: { absent: ['curve-allowance-untrimmed', 'not-at-level', 'off-grain'] } }),
  unsolved('TC090', 'S101', { 'upright-slack-at-side-hip': 2, 'leg-loose-all-round': 1, 'fold-at-centre-front': 1 }, 'Front wrinkles left undiagnosed until the width is out.', { shape: ['shallow-seat'] }),
  unsolved('TC093', 'S112', { 'waist-gapes-behind': 3, 'taut-lines-rising-from-front-fork': 2 }, 'Angling the band at the sides was not enough; abandoned for want of cloth.', { shape: ['hollow-above-seat'] }),
  unsolved('TC097', 'S115', { 'fork-binds-when-sitting': 2, 'seat-drawn-in-at-centre-back': 2, 'waist-gapes-behind': 2, 'level-folds-down-back-leg': 2 }, 'Three improvised changes at once; back length was never tested.', { shape: ['hollow-above-seat'] }),
]; // prettier-ignore
