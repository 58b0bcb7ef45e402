import type { Cause } from '../schema';
import { cause } from './build';

/** What looks like a fault of the draft and is none: the remedy is an action and a new photo, never paper. */
export const causes: Cause[] = [
  cause('stance', 'the way of standing', 'Hips pushed forward or out, weight on one leg, a bent neck.', 0.08, 'Stand in the usual shoes, eyes ahead, weight on both feet, after five steps. Rock the pelvis: folds that leave belong to the stance. Take the photo again.', 'trousers:TC070'),
  cause('not-at-level', 'the waist seam off its mark', 'The waist seam sits higher or lower than it was drafted for.', 0.3, 'Tie a string round the waist and bring the waist seam to its mark in front, behind and at both sides; measure where it sits. Take the photo again.'),
  cause('curve-allowance-untrimmed', 'the crotch allowance left wide', 'A wide or unclipped allowance in the curve holds it up and imitates a short fork.', 0.25, 'Take it off. Trim the curve below the notches to 10 mm (3/8 in), stitch it twice, do not press it open. Wear it again.'),
  cause('curve-stretched-in-sewing', 'the curve stretched in sewing', 'The crotch seam was pulled longer at the machine.', 0.04, 'Measure the sewn curve against the paper; ease it back over a tape, then wear it again.'),
  cause('off-grain', 'cut off the grain', 'The grain line does not hang plumb though the seams were right.', 0.06, 'Look at the drawn grain line: where it does not hang straight, cut that piece again before anything is changed.', 'trousers:TF038'),
  { ...cause('stretch-the-wrong-way', 'the stretch runs the wrong way', 'The cloth stretches along the leg and not round it.', 0.03, 'Cut again with the greater stretch round the body.', 'trousers:TC087'), onlyIn: ['stretch-woven', 'knit'] },
  cause('cloth-grown', 'the cloth has grown', 'It has become longer or wider in wearing.', 0.05, 'Wear it for 30 minutes, then measure against the paper. Growth over 3 per cent is the cloth, not the draft.', 'standards:F09'),
  cause('pocket-without-stay', 'a pocket mouth without a stay', 'The mouth of the pocket stretches and stands open though the hip is smooth.', 0.08, 'Pin the mouth shut: where the hip stays smooth, stay the edge with tape and baste it again.', 'trousers:TC046'),
  cause('layers-or-pocket-contents', 'layers beneath or full pockets', 'Something worn beneath or carried stands out.', 0.04, 'Empty the pockets, wear what will be worn beneath, and take the photo again.'),
  cause('not-sewn-as-planned', 'not sewn as it was drafted', 'Another allowance, a dart closed wrongly, one leg swapped.', 0.06, 'Measure the sewn seams against the paper and baste again where they differ.'),
  cause('lining-or-cling', 'cling or lining', 'The cloth clings to tights or is held by its lining.', 0.03, 'Wear a smooth layer, or free the lining, and take the photo again.', 'trousers:TC029'),
]; // prettier-ignore
