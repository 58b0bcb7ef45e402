import type { Correction } from '../schema';
import { correction } from './build';

/** The crotch points, the curves between them, and the slope of the seams above. */
export const forkCorrections: Correction[] = [
  correction({
    id: 'extend-back-point', name: 'Lengthen the back crotch point', group: 'back-point',
    description: 'Move the back crotch point out along the crotch line by a little and draw the inseam from it to nothing at the knee.',
    amounts: [3, 6, 10, 19], vector: [['back-extension', 1], ['back-thigh', 1, '~']], stage: 3, seam: 'back-crotch', neverWith: ['raise-centre-back', 'wedge-into-back', 'hollow-back-curve'],
    pieces: ['back'], operators: ['extend-point'], keep: ['the curve above the notch', 'knee', 'hip'], true: ['the curve square to the inseam'], walk: ['the inseam keeps its drafted ease'],
    mistakes: ['The drafted ease of the inseam is lost', 'The thigh grows and hides the rest'], muslin: 'patch', sources: ['trousers:TF045'],
  }),
  correction({
    id: 'shorten-back-point', name: 'Shorten the back crotch point', group: 'back-point',
    description: 'Move the back crotch point in and draw the inseam from it to nothing at the knee.',
    amounts: [3, 5, 8, 16], vector: [['back-extension', -1], ['back-thigh', -1, '~']], stage: 3, seam: 'back-crotch', neverWith: ['raise-centre-back', 'wedge-into-back', 'pin-out-back-fold', 'hollow-back-curve'],
    pieces: ['back'], operators: ['extend-point'], keep: ['hip', 'centre back above the notch'], true: ['the curve square to the inseam'], walk: ['the inseam keeps its drafted ease'],
    mistakes: ['The folds were slope, or a low seat', 'Sitting was not tried'],
  }),
  correction({
    id: 'extend-front-point', name: 'Lengthen the front crotch point', group: 'front-point',
    description: 'Move the front crotch point out along the crotch line and draw the inseam from it to nothing at the knee.',
    amounts: [2, 5, 8, 12], vector: [['front-extension', 1], ['front-thigh', 1, '~']], stage: 3, seam: 'front-crotch', neverWith: ['let-out-thigh-side'],
    pieces: ['front'], operators: ['extend-point'], keep: ['centre front', 'the fly notch', 'knee'], true: ['the curve'], walk: ['inseams'],
    mistakes: ['The curve was untrimmed', 'The rise was short'], muslin: 'patch', sided: true,
  }),
  correction({
    id: 'shorten-front-point', name: 'Shorten the front crotch point', group: 'front-point',
    description: 'Move the front crotch point in and draw the inseam from it to nothing at the knee.',
    amounts: [2, 3, 6, 12], vector: [['front-extension', -1], ['front-thigh', -1, '~']], stage: 3, seam: 'front-crotch',
    pieces: ['front'], operators: ['extend-point'], keep: ['centre front', 'the fly notch'], true: ['the curve'], walk: ['inseams'],
    mistakes: ['The cloth is slack because the waist is loose', 'Drafted below what sitting needs'], sided: true,
  }),
  correction({
    id: 'hollow-back-curve', name: 'Hollow the back curve', group: 'back-curve', description: 'Cut the back curve deeper along its bisector, point and centre back kept.',
    amounts: [3, 5, 8, 16], vector: [['back-curve', 1], ['hip-back', -2, '~']], stage: 3, seam: 'back-crotch', neverWith: ['extend-back-point', 'shorten-back-point', 'wedge-into-back'],
    pieces: ['back'], operators: ['reshape-curve'], keep: ['the point', 'centre back above the hip'], true: ['no corner at the notch'], walk: ['crotch seams'],
    mistakes: ['The seat is tight already: this takes twice the amount round', 'Cut before it was basted'], risk: 0.3, sources: ['trousers:TF010'],
  }),
  correction({
    id: 'fill-back-curve', name: 'Fill the back curve', group: 'back-curve', description: 'Draw the back curve shallower on paper.',
    amounts: [3, 3, 6, 10], vector: [['back-curve', -1], ['hip-back', 2, '~']], stage: 3, seam: 'back-crotch', neverWith: ['extend-back-point', 'shorten-back-point'],
    pieces: ['back'], operators: ['reshape-curve'], keep: ['the point', 'centre back'], true: ['no corner at the notch'], walk: ['crotch seams'],
    mistakes: ['Tried on the cloth', 'It shortens the seam as well'], muslin: 'new-cloth',
  }),
  correction({
    id: 'deepen-front-curve', name: 'Deepen the front curve', group: 'front-curve', description: 'Cut the front curve deeper along its bisector.',
    amounts: [2, 3, 5, 8], vector: [['front-curve', 1]], stage: 3, seam: 'front-crotch', pieces: ['front'], operators: ['reshape-curve'], keep: ['the fly notch', 'the point'], true: ['no corner at the notch'], walk: ['crotch seams'],
    mistakes: ['The fly no longer lies', 'Print is not of one mind on this'], risk: 0.3, sources: ['trousers:TK019'],
  }),
  correction({
    id: 'fill-front-curve', name: 'Fill the front curve', group: 'front-curve', description: 'Draw the front curve shallower on paper.',
    amounts: [2, 3, 5, 8], vector: [['front-curve', -1]], stage: 3, seam: 'front-crotch', pieces: ['front'], operators: ['reshape-curve'], keep: ['the fly notch', 'the point'], true: ['no corner at the notch'], walk: ['crotch seams'],
    mistakes: ['It cuts in when sitting', 'Used for a long rise'], muslin: 'new-cloth',
  }),
  correction({
    id: 'more-back-slope', name: 'More slope of the back seam', group: 'back-slope', description: 'Let centre back lean more toward the side at the waist; what it loses there the side is given.',
    amounts: [3, 6, 12, 25], vector: [['back-slope', 1], ['back-rise', 0.2, '~']], stage: 4, seam: 'back-crotch', neverWith: ['take-in-centre-back', 'let-out-centre-back'], pieces: ['back'], operators: ['pivot-centre'],
    keep: ['hip and waist width', 'side seam length'], true: ['centre back', 'the waist square'], walk: ['waistband'], mistakes: ['Read as a smaller waist', 'Folds in standing are not foretold'], sources: ['trousers:S02'],
  }),
  correction({
    id: 'less-back-slope', name: 'Less slope of the back seam', group: 'back-slope', description: 'Straighten centre back; what it gains at the waist the side loses.',
    amounts: [3, 6, 12, 25], vector: [['back-slope', -1], ['back-rise', -0.2, '~']], stage: 4, seam: 'back-crotch', neverWith: ['take-in-centre-back', 'let-out-centre-back'], pieces: ['back'], operators: ['pivot-centre'],
    keep: ['hip and waist width', 'side seam length'], true: ['centre back', 'the waist square'], walk: ['waistband'], mistakes: ['The waist grows', 'Sitting is worse and was not tried'], sources: ['trousers:TC010'],
  }),
  correction({
    id: 'more-front-slope', name: 'Centre front leaning out', group: 'front-slope', description: 'Let centre front lean out at the waist, widths kept.',
    amounts: [3, 5, 8, 16], vector: [['front-slope', 1]], stage: 4, seam: 'front-crotch', pieces: ['front', 'fly'], operators: ['pivot-centre'], keep: ['hip', 'the fly end', 'waist width'], true: ['centre front straight'], walk: ['fly', 'waistband'],
    mistakes: ['It shows in stripes', 'A curve at centre front'],
  }),
  correction({
    id: 'less-front-slope', name: 'Centre front leaning back', group: 'front-slope', description: 'Bring centre front back at the waist, widths kept.',
    amounts: [3, 5, 8, 16], vector: [['front-slope', -1]], stage: 4, seam: 'front-crotch', pieces: ['front', 'fly'], operators: ['pivot-centre'], keep: ['hip', 'the fly end', 'waist width'], true: ['centre front straight'], walk: ['fly', 'waistband'],
    mistakes: ['It shows in stripes', 'A curve at centre front'],
  }),
  correction({
    id: 'shape-under-seat', name: 'Shape it away under the seat', group: 'under-seat', description: 'Take the fold under the seat out by a seam down the back leg, nothing at side and inseam.',
    amounts: [3, 5, 8, 12], vector: [['under-seat-length', -1]], stage: 4, seam: 'other', pieces: ['back'], operators: ['shaped-seam'], keep: ['side and inseam lengths'], true: ['the new seam'], walk: ['the new seam'],
    mistakes: ['Tucked across the whole width', 'In a formal cloth'], risk: 0.3, sided: true, sources: ['trousers:TC059'],
  }),
  correction({
    id: 'lengthen-under-seat', name: 'Give length under the seat', group: 'under-seat', description: 'Slash the back across under the seat from the middle to both seams and spread in the middle, nothing at side and inseam.',
    amounts: [3, 5, 8, 12], vector: [['under-seat-length', 1]], stage: 4, seam: 'other', neverWith: ['shape-under-seat', 'shorten-back-point'], pieces: ['back'], operators: ['shaped-seam'], keep: ['side and inseam lengths'], true: ['the new seam'], walk: ['the new seam'],
    mistakes: ['Spread across the whole width', 'The back slope was too small for a sitter'], risk: 0.3, muslin: 'patch', sided: true, sources: ['trousers:TF051'],
  }),
]; // prettier-ignore
