import type { Correction } from '../schema';
import { correction } from './build';

const BOTH = ['side seams', 'inseams'];

/** Below the thigh, and what is no length at all. */
export const legCorrections: Correction[] = [
  correction({
    id: 'swing-leg-in', name: 'Swing the leg in at the hem', group: 'leg-line', description: 'Move the hem toward the inseam, pivoting at the thigh; both seams move alike.',
    amounts: [3, 6, 13, 25], vector: [['leg-swing', 1]], stage: 6, seam: 'other', neverWith: ['shift-knee-in', 'shift-knee-out'], pieces: ['front', 'back'], operators: ['swing-leg'], keep: ['hem width', 'thigh', 'the points'], true: ['both seams from the thigh', 'hem square'], walk: BOTH,
    mistakes: ['One seam only', 'The wrong way: try with the feet 60 cm apart'], sided: true, muslin: 'new-cloth', sources: ['trousers:TF028'],
  }),
  correction({
    id: 'swing-leg-out', name: 'Swing the leg out at the hem', group: 'leg-line', description: 'Move the hem toward the side, pivoting at the thigh; both seams move alike.',
    amounts: [3, 6, 13, 25], vector: [['leg-swing', -1]], stage: 6, seam: 'other', neverWith: ['shift-knee-in', 'shift-knee-out'], pieces: ['front', 'back'], operators: ['swing-leg'], keep: ['hem width', 'thigh', 'the points'], true: ['both seams from the thigh', 'hem square'], walk: BOTH,
    mistakes: ['One seam only', 'The wrong way: try with the feet 60 cm apart'], sided: true, muslin: 'new-cloth', sources: ['trousers:TF028'],
  }),
  correction({
    id: 'shift-knee-in', name: 'Shift the knee in', group: 'leg-line', description: 'Move the knee toward the inseam on both seams.',
    amounts: [3, 5, 10, 19], vector: [['knee-shift', 1]], stage: 6, seam: 'other', neverWith: ['swing-leg-in', 'swing-leg-out'], pieces: ['front', 'back'], operators: ['shift-leg'], keep: ['knee girth', 'hem'], true: ['both seams'], walk: BOTH,
    mistakes: ['The leg was too narrow, not bent', 'It was the stance'], sided: true, muslin: 'new-cloth', sources: ['trousers:TF030'],
  }),
  correction({
    id: 'shift-knee-out', name: 'Shift the knee out', group: 'leg-line', description: 'Move the knee toward the side on both seams.',
    amounts: [3, 5, 10, 19], vector: [['knee-shift', -1]], stage: 6, seam: 'other', neverWith: ['swing-leg-in', 'swing-leg-out'], pieces: ['front', 'back'], operators: ['shift-leg'], keep: ['knee girth', 'hem'], true: ['both seams'], walk: BOTH,
    mistakes: ['The leg was too narrow, not bent', 'It was the stance'], sided: true, muslin: 'new-cloth',
  }),
  correction({
    id: 'let-out-calf', name: 'Let out the calf', group: 'calf', description: 'Let out all four edges at the calf by the same amount.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 4, level: 'calf', vector: [['calf-girth', 4], ['hem-width', 2, '~']], stage: 6, seam: 'girth', pieces: ['front', 'back'], operators: ['let-out-taper'], keep: ['the centre line', 'both sides equal below the knee'], true: ['the run to knee and hem'], walk: BOTH,
    mistakes: ['One seam only: the leg spirals', 'The hem facing is not changed'], sources: ['trousers:TK011'],
  }),
  correction({
    id: 'let-out-knee', name: 'Let out the knee', group: 'knee', description: 'Let out all four edges at the knee by the same amount.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 4, level: 'knee', vector: [['knee-girth', 4]], stage: 6, seam: 'girth', pieces: ['front', 'back'], operators: ['let-out-taper'], keep: ['the centre line', 'both sides equal below the knee'], true: ['the run to thigh and calf'], walk: BOTH,
    mistakes: ['One seam only: the leg spirals', 'Carried to the thigh'], sources: ['trousers:TK011'],
  }),
  correction({
    id: 'take-in-knee', name: 'Take in the knee', group: 'knee', description: 'Take in all four edges at the knee by the same amount.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 4, level: 'knee', vector: [['knee-girth', -4]], stage: 6, seam: 'girth', pieces: ['front', 'back'], operators: ['take-in-taper'], keep: ['the centre line'], true: ['the run to thigh and calf'], walk: BOTH,
    mistakes: ['One seam only: the leg spirals', 'The knee was measured straight, not bent'], sources: ['trousers:TK011'],
  }),
  correction({
    id: 'shorten-behind-knee', name: 'Shorten the back leg behind the knee', group: 'leg-line', description: 'Take a wedge out of the back at the knee, hinged at both seams, and ease the seams.',
    amounts: [3, 5, 8, 12], vector: [['back-leg-length', -1]], stage: 6, seam: 'other', pieces: ['back'], operators: ['hinged-overlap'], keep: ['the front', 'the side'], true: ['both seams'], walk: ['both seams, to be eased'],
    mistakes: ['The heel lifts the hem', 'A catching calf was the cause'], sided: true,
  }),
  correction({
    id: 'lower-hem-behind', name: 'Slope the hem down behind', group: 'hem', description: 'Let the hem fall lower behind than in front.',
    amounts: [3, 6, 10, 15], vector: [['hem-slope', 1]], stage: 8, seam: 'other', pieces: ['front', 'back'], operators: ['slope-hem'], keep: ['the front length'], true: ['hem'], walk: ['side seams', 'inseams'],
    mistakes: ['Before the leg length is settled', 'The hem facing is not changed'], sources: ['trousers:TM046'],
  }),
  correction({
    id: 'shift-leg-in', name: 'Move the leg centre in', group: 'leg-line', description: 'Shift the leg under the hip toward the inseam.',
    amounts: [3, 5, 8, 12], vector: [['leg-centre', 1]], stage: 6, seam: 'other', pieces: ['front', 'back'], operators: ['shift-leg'], keep: ['hip', 'hem width'], true: ['both seams'], walk: BOTH, mistakes: ['One seam only', 'The grain was off'], muslin: 'new-cloth', sources: ['trousers:TF042'],
  }),
  correction({
    id: 'shift-leg-out', name: 'Move the leg centre out', group: 'leg-line', description: 'Shift the leg under the hip toward the side.',
    amounts: [3, 5, 8, 12], vector: [['leg-centre', -1]], stage: 6, seam: 'other', pieces: ['front', 'back'], operators: ['shift-leg'], keep: ['hip', 'hem width'], true: ['both seams'], walk: BOTH, mistakes: ['One seam only', 'The grain was off'], muslin: 'new-cloth', sources: ['trousers:TF042'],
  }),
  correction({
    id: 'take-in-calf', name: 'Take in the calf', group: 'calf', description: 'Take in all four edges at the calf by the same amount.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 4, level: 'calf', vector: [['calf-girth', -4], ['hem-width', -2, '~']], stage: 6, seam: 'girth', pieces: ['front', 'back'], operators: ['take-in-taper'], keep: ['the centre line'], true: ['the run to knee and hem'], walk: BOTH,
    mistakes: ['One seam only: the leg spirals', 'Sitting was not tried: the hem stays up'], sided: true, sources: ['trousers:TK011'],
  }),
  correction({
    id: 'let-out-hem', name: 'Widen the hem', group: 'hem', description: 'Let out all four edges at the hem by the same amount, running to nothing at the knee.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 4, level: 'calf', vector: [['hem-width', 4], ['calf-girth', 2, '~']], stage: 6, seam: 'girth', pieces: ['front', 'back'], operators: ['let-out-taper'], keep: ['the centre line', 'knee'], true: ['the run from the knee'], walk: BOTH,
    mistakes: ['One seam only: the leg spirals', 'The hem facing is not changed'], sources: ['trousers:TF033', 'trousers:TK011'],
  }),
  correction({
    id: 'take-in-hem', name: 'Narrow the hem', group: 'hem', description: 'Take in all four edges at the hem by the same amount, running to nothing at the knee.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 4, level: 'calf', vector: [['hem-width', -4], ['calf-girth', -2, '~']], stage: 6, seam: 'girth', pieces: ['front', 'back'], operators: ['take-in-taper'], keep: ['the centre line', 'knee'], true: ['the run from the knee'], walk: BOTH,
    mistakes: ['One seam only: the leg spirals', 'The foot no longer passes'], sources: ['trousers:TF049', 'trousers:TK011'],
  }),
  correction({
    id: 'lower-knee-line', name: 'Lower the knee line', group: 'knee', description: 'Move the shaping of the knee down on both seams, knee width kept.',
    amounts: [6, 15, 25, 50], vector: [['knee-level', 1]], stage: 6, seam: 'other', pieces: ['front', 'back'], operators: ['shift-knee-line'], keep: ['knee width', 'hem', 'leg length'], true: ['both seams'], walk: BOTH,
    mistakes: ['Before depth and length are settled', 'On one piece only'],
  }),
  correction({
    id: 'raise-knee-line', name: 'Raise the knee line', group: 'knee', description: 'Move the shaping of the knee up on both seams, knee width kept.',
    amounts: [6, 15, 25, 50], vector: [['knee-level', -1]], stage: 6, seam: 'other', pieces: ['front', 'back'], operators: ['shift-knee-line'], keep: ['knee width', 'hem', 'leg length'], true: ['both seams'], walk: BOTH,
    mistakes: ['Before depth and length are settled', 'On one piece only'],
  }),
  correction({
    id: 'bring-side-seam-forward', name: 'Bring the side seam forward at the hem', group: 'leg-line', description: 'Below the knee, give the back at the side what the front loses; only after the grain was looked at.',
    amounts: [3, 5, 8, 12], vector: [['leg-twist', 1]], stage: 6, seam: 'other', neverWith: ['bring-side-seam-back'], pieces: ['front', 'back'], operators: ['shift-seam'], keep: ['hem width', 'knee width', 'the grain'], true: ['side seams'], walk: BOTH,
    mistakes: ['The piece was cut off the grain', 'The wrong leg, from a mirrored photo'], sided: true, sources: ['trousers:TF038'],
  }),
  correction({
    id: 'bring-side-seam-back', name: 'Bring the side seam back at the hem', group: 'leg-line', description: 'Below the knee, give the front at the side what the back loses; only after the grain was looked at.',
    amounts: [3, 5, 8, 12], vector: [['leg-twist', -1]], stage: 6, seam: 'other', neverWith: ['bring-side-seam-forward'], pieces: ['front', 'back'], operators: ['shift-seam'], keep: ['hem width', 'knee width', 'the grain'], true: ['side seams'], walk: BOTH,
    mistakes: ['The piece was cut off the grain', 'The wrong leg, from a mirrored photo'], sided: true, sources: ['trousers:TF038'],
  }),
  correction({
    id: 'lengthen-behind-knee', name: 'Lengthen the back leg behind the knee', group: 'leg-line', description: 'Open a wedge in the back at the knee, hinged at both seams.',
    amounts: [3, 5, 8, 12], vector: [['back-leg-length', 1]], stage: 6, seam: 'other', neverWith: ['shorten-behind-knee'], pieces: ['back'], operators: ['hinged-spread'], keep: ['the front', 'the side'], true: ['both seams'], walk: ['both seams, to be eased'],
    mistakes: ['The front was too long', 'A short rise drew the leg up'], sided: true, muslin: 'patch',
  }),
  correction({
    id: 'level-hem', name: 'Level the hem', group: 'hem', description: 'Draw the hem higher behind, the front length kept.',
    amounts: [3, 6, 10, 15], vector: [['hem-slope', -1]], stage: 8, seam: 'other', neverWith: ['lower-hem-behind'], pieces: ['front', 'back'], operators: ['slope-hem'], keep: ['the front length'], true: ['hem'], walk: ['side seams', 'inseams'],
    mistakes: ['Before the leg length is settled', 'A loose front waist let the back drop'], sources: ['trousers:TM046', 'trousers:TC009'],
  }),
]; // prettier-ignore
