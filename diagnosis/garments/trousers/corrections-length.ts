import type { Correction } from '../schema';
import { correction } from './build';

const SIDE_LENGTH = 'side seam length';
/** What a change of the depth all round never goes with (fitter’s reference 1.10). */
const RISES = [
  'raise-centre-back', 'wedge-into-back', 'pin-out-back-fold', 'overlap-wedge-in-back', 'raise-centre-front', 'wedge-into-front', 'lower-centre-front',
  'raise-side-waist', 'lower-side-waist', 'tip-waist-forward',
]; // prettier-ignore

/** Depth, rises and the waist line: what runs up and down. */
export const lengthCorrections: Correction[] = [
  correction({
    id: 'lengthen-depth', name: 'Lengthen the depth all round', group: 'depth',
    description: 'Slash front and back straight across above the crotch line and spread them by the same amount.',
    amounts: [6, 10, 19, 38], vector: [['crotch-depth', 1], ['leg-length', 1, '~']], stage: 2, seam: 'length',
    neverWith: [...RISES],
    pieces: ['front', 'back'], operators: ['parallel-spread'], keep: ['waist', 'hip width', 'the curve', 'the fly notch'],
    true: ['centre front', 'centre back', 'sides', 'darts'], walk: ['side seams'],
    mistakes: ['Doing one piece only', 'The hem drops as much, and nobody shortens it'], muslin: 'patch',
  }),
  correction({
    id: 'shorten-depth', name: 'Shorten the depth all round', group: 'depth',
    description: 'Fold the same tuck across front and back above the crotch line.',
    amounts: [6, 10, 19, 38], vector: [['crotch-depth', -1], ['leg-length', -1, '~']], stage: 2, seam: 'length',
    neverWith: [...RISES],
    pieces: ['front', 'back'], operators: ['parallel-tuck'], keep: ['waist', 'hip width', 'the curve', 'the fly notch'],
    true: ['fly end', 'pocket ends', 'sides'], walk: ['side seams'],
    mistakes: ['Doing it while the thigh is tight', 'Tucking below the hip line'], sources: ['trousers:TC022', 'trousers:TF036'],
  }),
  correction({
    id: 'raise-centre-back', name: 'Raise centre back at the waist', group: 'back-rise',
    description: 'Raise the waist at centre back and run it to nothing at the side.',
    amounts: [3, 12, 19, 25], vector: [['back-rise', 1]], stage: 2, seam: 'back-crotch',
    neverWith: ['extend-back-point', 'wedge-into-back'], pieces: ['back', 'waistband'], operators: ['raise-waist-taper'], keep: [SIDE_LENGTH, 'hip'],
    true: ['square at centre back', 'the waist run'], walk: ['waistband: each back loses about a quarter of the amount'],
    mistakes: ['A point is left at centre back', 'The dart is not lengthened by as much'], sources: ['W10', 'trousers:TF025'],
  }),
  correction({
    id: 'wedge-into-back', name: 'Open a wedge across the back', group: 'back-rise',
    description: 'Slash the back from centre back to the stitching line of the side, keep that point as the hinge, and spread at centre back.',
    amounts: [3, 12, 19, 40], vector: [['back-rise', 1]], stage: 2, seam: 'back-crotch',
    neverWith: ['extend-back-point', 'raise-centre-back', 'hollow-back-curve'], pieces: ['back'], operators: ['hinged-spread'],
    keep: ['the side on its stitching line', 'the hip below the slash', 'the inseam'], true: ['centre back', 'the kick at the side', 'the dart'],
    walk: ['side seams', 'waistband'], mistakes: ['Hinging on the cut edge', 'The kick at the side is left in'], muslin: 'patch', sources: ['trousers:TF025'],
  }),
  correction({
    id: 'pin-out-back-fold', name: 'Take out the fold below the back band', group: 'back-rise',
    description: 'Pin out the fold at centre back to nothing at the side, and fold the paper the same.',
    amounts: [3, 10, 16, 25], vector: [['back-rise', -1]], stage: 2, seam: 'back-crotch', neverWith: ['extend-back-point'],
    pieces: ['back', 'waistband'], operators: ['hinged-overlap'], keep: [SIDE_LENGTH, 'hip'], true: ['centre back', 'the waist run', 'the dart'], walk: ['waistband'],
    mistakes: ['The fold comes from a tight hip', 'It was not tried sitting'], sources: ['trousers:TF004'],
  }),
  correction({
    id: 'raise-centre-front', name: 'Raise centre front', group: 'front-rise',
    description: 'Raise the waist at centre front and run it to nothing at the side.',
    amounts: [3, 6, 12, 25], vector: [['front-rise', 1]], stage: 2, seam: 'front-crotch', neverWith: ['wedge-into-front'],
    pieces: ['front', 'fly', 'waistband'], operators: ['raise-waist-taper'], keep: [SIDE_LENGTH, 'the fly end'], true: ['square at centre front'], walk: ['waistband', 'fly'],
    mistakes: ['The fly facing is forgotten', 'The waist was only loose'],
  }),
  correction({
    id: 'lower-centre-front', name: 'Lower centre front', group: 'front-rise',
    description: 'Lower the waist at centre front and run it to nothing at the side.',
    amounts: [3, 10, 19, 50], vector: [['front-rise', -1]], stage: 2, seam: 'front-crotch',
    pieces: ['front', 'fly', 'waistband'], operators: ['raise-waist-taper'], keep: [SIDE_LENGTH, 'hip', 'the fly end'], true: ['the waist run'], walk: ['waistband', 'fly'],
    mistakes: ['A loose waist had only dropped', 'The fold ran past the side: then it is depth'], sources: ['trousers:TF023', 'trousers:TC047'],
  }),
  correction({
    id: 'wedge-into-front', name: 'Open a wedge across the front', group: 'front-rise',
    description: 'Slash the front from centre front to the stitching line of the side and spread at centre front, for a rounded front.',
    amounts: [3, 10, 16, 32], vector: [['front-rise', 1]], stage: 2, seam: 'front-crotch', neverWith: ['raise-centre-front'],
    pieces: ['front', 'fly'], operators: ['hinged-spread'], keep: [SIDE_LENGTH, 'the hip of the back'], true: ['centre front straight for the fly', 'side'], walk: ['fly', 'waistband'],
    mistakes: ['A curved centre front that no zip follows', 'Width was wanted too and not given'], muslin: 'patch', sources: ['trousers:TC012'],
  }),
  correction({
    id: 'raise-side-waist', name: 'Raise the waist at one side', group: 'side-rise',
    description: 'Raise front and back at that side of the waist, to nothing at the centres.',
    amounts: [3, 6, 10, 25], vector: [['side-rise', 1]], stage: 2, seam: 'length', sided: true,
    pieces: ['front', 'back', 'waistband'], operators: ['raise-waist-taper'], keep: ['centre front', 'centre back', 'hip level'], true: ['the waist run'], walk: ['the sides: front as back'],
    mistakes: ['The wrong side, from a mirror picture', 'The front only'],
  }),
  correction({
    id: 'lower-side-waist', name: 'Lower the waist at one side', group: 'side-rise',
    description: 'Lower front and back at that side of the waist, to nothing at the centres.',
    amounts: [3, 6, 10, 25], vector: [['side-rise', -1]], stage: 2, seam: 'length', sided: true,
    pieces: ['front', 'back', 'waistband'], operators: ['raise-waist-taper'], keep: ['centre front', 'centre back', 'hip level'], true: ['the waist run'], walk: ['the sides: front as back'],
    mistakes: ['The wrong side, from a mirror picture', 'The front only'],
  }),
  correction({
    id: 'lower-crotch-level', name: 'Lower the crotch level', group: 'depth',
    description: 'Draw both curves lower and widen the fork by nearly as much, so that the stride stays.',
    amounts: [3, 6, 10, 19], vector: [['crotch-depth', 1], ['front-extension', 0.4, '~'], ['back-extension', 0.4, '~']], stage: 3, seam: 'back-crotch',
    neverWith: ['lengthen-depth', 'shorten-depth', 'extend-back-point', 'extend-front-point'], pieces: ['front', 'back'], operators: ['reshape-curve', 'extend-point'],
    keep: ['waist', SIDE_LENGTH], true: ['both curves'], walk: ['inseams'], mistakes: ['The stride is lost', 'The legs were only tight'], risk: 0.3, sources: ['trousers:TF055', 'trousers:TK029'],
  }),
  correction({
    id: 'lengthen-leg', name: 'Lengthen the leg', group: 'leg-length', description: 'Slash the lower leg across and spread; over 50 mm, split it above and below the knee.',
    amounts: [6, 12, 38, 125], vector: [['leg-length', 1]], stage: 8, seam: 'length', sided: true, pieces: ['front', 'back'], operators: ['parallel-spread'],
    keep: ['hem width', 'knee'], true: ['side', 'inseam'], walk: ['side seams', 'inseams'], mistakes: ['Before rise and shoes are settled', 'In the flared part'], muslin: 'new-cloth', sources: ['trousers:TC087'],
  }),
  correction({
    id: 'shorten-leg', name: 'Shorten the leg', group: 'leg-length', description: 'Fold a tuck across the lower leg.',
    amounts: [6, 12, 38, 125], vector: [['leg-length', -1]], stage: 8, seam: 'length', sided: true, pieces: ['front', 'back'], operators: ['parallel-tuck'],
    keep: ['hem width', 'knee'], true: ['side', 'inseam'], walk: ['side seams', 'inseams'], mistakes: ['Before rise and shoes are settled', 'In the flared part'],
  }),
  correction({
    id: 'overlap-wedge-in-back', name: 'Overlap a wedge across the seat', group: 'back-rise',
    description: 'Slash the back from centre back over the seat to the stitching line of the side, keep that point as the hinge, and overlap at centre back.',
    amounts: [3, 6, 12, 25], vector: [['back-rise', -1], ['back-slope', -0.3, '~']], stage: 2, seam: 'back-crotch',
    neverWith: ['pin-out-back-fold', 'shorten-back-point', 'fill-back-curve', 'lengthen-depth', 'shorten-depth'], pieces: ['back'], operators: ['hinged-overlap'],
    keep: ['the side on its stitching line'], true: ['centre back', 'the side'], walk: ['side seams', 'waistband'],
    mistakes: ['It takes length that sitting needs', 'Used for a low seat, which wants the curve'], risk: 0.25,
  }),
  correction({
    id: 'tip-waist-forward', name: 'Tip the waist: front down, back up', group: 'back-rise',
    description: 'Lower centre front and raise centre back by the same amount, the waist at the side kept.',
    amounts: [3, 6, 12, 30], vector: [['front-rise', -1], ['back-rise', 1]], stage: 2, seam: 'length',
    neverWith: ['raise-centre-back', 'wedge-into-back', 'pin-out-back-fold', 'raise-centre-front', 'lower-centre-front', 'wedge-into-front', 'lengthen-depth', 'shorten-depth', 'extend-back-point'],
    pieces: ['front', 'back', 'waistband', 'fly'], operators: ['lower-waist-taper', 'raise-waist-taper'], keep: ['the side point', 'hip'],
    true: ['square at centre front and centre back', 'the waist run'], walk: ['waistband'],
    mistakes: ['Added on top of a front already lowered', 'The band seam is not squared again'], risk: 0.3, sources: ['trousers:TC055'],
  }),
  correction({
    id: 'raise-crotch-level', name: 'Raise the crotch level', group: 'depth',
    description: 'Draw the crotch point and the foot of the curve higher, waist and side kept; the inseam becomes longer.',
    amounts: [3, 6, 10, 19], vector: [['crotch-depth', -1], ['front-extension', -0.4, '~'], ['back-extension', -0.4, '~']], stage: 3, seam: 'back-crotch',
    neverWith: ['raise-centre-back', 'wedge-into-back', 'shorten-depth', 'lengthen-depth'], pieces: ['front', 'back'], operators: ['reshape-curve', 'extend-point'],
    keep: ['waist', 'side length'], true: ['both curves'], walk: ['inseams, longer by the amount'],
    mistakes: ['No cloth for it on a muslin that is cut', 'The leg was caught lower down'], muslin: 'new-cloth', risk: 0.25,
  }),
]; // prettier-ignore
