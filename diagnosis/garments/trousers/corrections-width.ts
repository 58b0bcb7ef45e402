import type { Correction } from '../schema';
import { correction } from './build';

/** Hip, thigh and waist: what runs round. Amounts are per edge where edges are let out or taken in. */
export const widthCorrections: Correction[] = [
  correction({
    id: 'let-out-hip-side', name: 'Let out the hip at the side', group: 'hip', description: 'Let out front and back at the side, running to nothing at waist and thigh.',
    amounts: [3, 5, 10, 16], basis: 'edge', edges: 4, level: 'hip', vector: [['hip-front', 2], ['hip-back', 2]], stage: 1, seam: 'girth', pieces: ['front', 'back'], operators: ['let-out-taper'],
    keep: ['centre front', 'centre back', 'grain', 'notches'], true: ['the run at waist and thigh'], walk: ['side seams'], mistakes: ['The total put on each edge: four times too much', 'It stops dead at the hip'],
  }),
  correction({
    id: 'take-in-hip-side', name: 'Take in the hip at the side', group: 'hip', description: 'Take in front and back at the side, running to nothing at waist and thigh.',
    amounts: [3, 5, 10, 16], basis: 'edge', edges: 4, level: 'hip', vector: [['hip-front', -2], ['hip-back', -2], ['back-rise', -0.2, '~'], ['front-rise', -0.2, '~']], stage: 5, seam: 'girth', pieces: ['front', 'back'], operators: ['take-in-taper'],
    keep: ['centre front', 'centre back', 'grain', 'notches'], true: ['the run at waist and thigh'], walk: ['side seams'], mistakes: ['It eats crotch length', 'Done before the rise is right'], sources: ['trousers:TC036'],
  }),
  correction({
    id: 'let-out-centre-back', name: 'Let out the centre back', group: 'hip', description: 'Let out the centre back seam above the notch.',
    amounts: [3, 6, 12, 25], basis: 'edge', edges: 2, level: 'hip', vector: [['hip-back', 2], ['waist-back', 2]], stage: 1, seam: 'girth', neverWith: ['more-back-slope', 'less-back-slope'], pieces: ['back', 'waistband'], operators: ['let-out-taper'],
    keep: ['the curve below the notch', 'side'], true: ['the run of centre back'], walk: ['waistband'], mistakes: ['Less than 10 mm of allowance is left', 'Carried into the curve'], sources: ['trousers:TF047'],
  }),
  correction({
    id: 'take-in-centre-back', name: 'Take in the centre back', group: 'waist', description: 'Take in the centre back seam above the notch.',
    amounts: [3, 6, 12, 38], basis: 'edge', edges: 2, level: 'hip', vector: [['waist-back', -2], ['hip-back', -1]], stage: 5, seam: 'girth', neverWith: ['more-back-slope', 'less-back-slope'], pieces: ['back', 'waistband'], operators: ['take-in-taper'],
    keep: ['the curve below the notch'], true: ['the run of centre back'], walk: ['waistband', 'pockets apart'], mistakes: ['The back pockets meet', 'It should have been another size'], sources: ['trousers:TF047'],
  }),
  correction({
    id: 'spread-back', name: 'Spread the back lengthwise', group: 'hip', description: 'Slash the back from waist to hem beside the grain line and spread at the hip.',
    amounts: [3, 6, 10, 19], basis: 'piece', level: 'hip', vector: [['hip-back', 2], ['back-thigh', 1]], stage: 1, seam: 'girth', pieces: ['back'], operators: ['parallel-spread'],
    keep: ['the front', 'side seam length', 'dart intake'], true: ['waist', 'hem'], walk: ['waistband'], mistakes: ['The knee grows unseen', 'The grain is left off centre'], muslin: 'new-cloth',
  }),
  correction({
    id: 'spread-front', name: 'Spread the front lengthwise', group: 'hip', description: 'Slash the front from waist to hem beside the crease and spread over the front.',
    amounts: [3, 5, 10, 16], basis: 'piece', level: 'hip', vector: [['hip-front', 2], ['abdomen-width', 2], ['front-thigh', 1]], stage: 1, seam: 'girth', pieces: ['front'], operators: ['parallel-spread'],
    keep: ['the back', 'the fly line'], true: ['waist', 'hem'], walk: ['pocket'], mistakes: ['The pocket slides round', 'Pleat or dart is not spaced again'], muslin: 'new-cloth',
  }),
  correction({
    id: 'narrow-front', name: 'Narrow the front', group: 'hip', description: 'Fold a long tuck down the front beside the crease.',
    amounts: [3, 5, 10, 16], basis: 'piece', level: 'hip', vector: [['hip-front', -2], ['abdomen-width', -2], ['front-thigh', -1]], stage: 5, seam: 'girth', pieces: ['front'], operators: ['parallel-tuck'],
    keep: ['the back', 'the fly line'], true: ['waist', 'hem'], walk: ['pocket'], mistakes: ['The pocket slides round', 'The slack was a loose waist'],
  }),
  correction({
    id: 'round-out-side', name: 'Round out the side above the hip', group: 'high-hip', description: 'Draw the side edge rounder between waist and hip.',
    amounts: [2, 3, 6, 12], vector: [['high-hip-curve', 1]], stage: 5, seam: 'other', pieces: ['front', 'back'], operators: ['reshape-edge'], keep: ['hip point', 'waist point'], true: ['no corner at the hip'], walk: ['side seams: front as back'],
    mistakes: ['One piece only', 'A corner at the hip'], sided: true,
  }),
  correction({
    id: 'flatten-side', name: 'Flatten the bubble at the side', group: 'high-hip', description: 'Draw the side edge flatter between waist and hip.',
    amounts: [2, 3, 6, 12], vector: [['high-hip-curve', -1]], stage: 5, seam: 'other', pieces: ['front', 'back'], operators: ['reshape-edge'], keep: ['hip', 'waist'], true: ['the run of the side'], walk: ['side seams'],
    mistakes: ['A hollow seam', 'The bubble was made by a tight waist'], sided: true,
  }),
  correction({
    id: 'let-out-waist-front', name: 'Let out the waist in front', group: 'waist', description: 'Let out front dart or side at the waist, to nothing at the hip.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 2, level: 'waist', vector: [['waist-front', 2]], stage: 7, seam: 'girth', pieces: ['front', 'waistband'], operators: ['let-out-taper'], keep: ['hip', 'centre front'], true: ['the waist run'], walk: ['waistband'],
    mistakes: ['Let out where it was not wanted', 'The dart vanishes and the hip bulges'], sources: ['trousers:TF027'],
  }),
  correction({
    id: 'take-in-waist-front', name: 'Take in the waist in front', group: 'waist', description: 'Take in front dart or side at the waist, to nothing at the high hip.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 2, level: 'waist', vector: [['waist-front', -2]], stage: 7, seam: 'girth', pieces: ['front', 'waistband'], operators: ['take-in-taper'], keep: ['hip'], true: ['the waist run'], walk: ['waistband'],
    mistakes: ['Carried below the high hip', 'The gape came from the rise'], sources: ['trousers:TC081'],
  }),
  correction({
    id: 'let-out-waist-back', name: 'Let out the waist behind', group: 'waist', description: 'Let out the back darts or the side at the waist, to nothing at the hip.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 2, level: 'waist', vector: [['waist-back', 2]], stage: 7, seam: 'girth', pieces: ['back', 'waistband'], operators: ['let-out-taper'], keep: ['hip', 'centre front'], true: ['the waist run'], walk: ['waistband'],
    mistakes: ['Let out where it was not wanted', 'The dart vanishes and the hip bulges'],
  }),
  correction({
    id: 'deepen-back-dart', name: 'Deepen the back darts', group: 'waist', description: 'Take more into each back dart at the waist.',
    amounts: [3, 6, 10, 25], basis: 'piece', level: 'waist', vector: [['waist-back', -2]], stage: 7, seam: 'girth', pieces: ['back', 'waistband'], operators: ['resize-dart'], keep: ['hip', 'centre back', 'side seam length'], true: ['the dart cap'], walk: ['yoke', 'waistband'],
    mistakes: ['It ends too high and makes a bubble', 'It points past the fullest place'], sources: ['trousers:TF048'],
  }),
  correction({
    id: 'lengthen-back-dart', name: 'Lengthen the back dart', group: 'dart', description: 'Let the dart end lower, its intake kept; stop 20 to 25 mm short of the fullest place.',
    amounts: [6, 12, 25, 40], vector: [['back-dart-point', 1]], stage: 7, seam: 'other', pieces: ['back'], operators: ['move-dart-point'], keep: ['intake'], true: ['dart legs equal'], walk: ['dart legs'],
    mistakes: ['It reaches the fullest place', 'The legs are unequal'], sources: ['trousers:TC028'],
  }),
  correction({
    id: 'shorten-back-dart', name: 'Shorten the back dart', group: 'dart', description: 'Let the dart end higher, its intake kept.',
    amounts: [6, 12, 25, 40], vector: [['back-dart-point', -1]], stage: 7, seam: 'other', pieces: ['back'], operators: ['move-dart-point'], keep: ['intake'], true: ['dart legs equal'], walk: ['dart legs'],
    mistakes: ['The hip bulges at its end', 'The legs are unequal'], sources: ['trousers:TC027'],
  }),
  correction({
    id: 'contour-waistband', name: 'Curve the waistband more', group: 'waistband', description: 'Slash the band from its top edge and overlap there, in several places.',
    amounts: [3, 8, 16, 30], basis: 'round', level: 'waist', vector: [['waistband-contour', 1]], stage: 7, seam: 'other', pieces: ['waistband'], operators: ['contour-band'], keep: ['the lower edge', 'the overlap at centre front'], true: ['both edges smooth'], walk: ['band to trousers'],
    mistakes: ['The lower edge is shortened too', 'A bias edge is not stayed'],
  }),
  correction({
    id: 'let-out-thigh-side', name: 'Let out the thigh at the side', group: 'thigh', description: 'Let out front and back at the side from hip notch to knee.',
    amounts: [3, 5, 10, 16], basis: 'edge', edges: 2, level: 'thigh', vector: [['front-thigh', 1], ['back-thigh', 1]], stage: 1, seam: 'girth', neverWith: ['extend-back-point', 'extend-front-point'], pieces: ['front', 'back'], operators: ['let-out-taper'],
    keep: ['hip notch', 'knee'], true: ['the run at hip and knee'], walk: ['side seams'], mistakes: ['Thigh width is carried to the knee', 'Added to the front only'], sources: ['trousers:TC052', 'W8'],
  }),
  correction({
    id: 'take-in-back-inseam', name: 'Take in the back inseam at the top', group: 'thigh', description: 'Take in the back inseam over its top 250 to 300 mm, point kept.',
    amounts: [3, 6, 10, 16], basis: 'edge', edges: 1, level: 'thigh', vector: [['back-thigh', -1]], stage: 5, seam: 'girth', neverWith: ['extend-back-point', 'shorten-back-point'], pieces: ['back'], operators: ['take-in-taper'],
    keep: ['the point', 'the front inseam', 'knee'], true: ['the run of the inseam'], walk: ['the inseam keeps its drafted ease'], mistakes: ['Taken in to the knee', 'The thigh catches on stairs'], sided: true, sources: ['trousers:TF012'],
  }),
  correction({
    id: 'take-in-thigh-side', name: 'Take in the thigh at the side', group: 'thigh', description: 'Take in front and back at the side from hip notch to knee.',
    amounts: [3, 5, 10, 16], basis: 'edge', edges: 2, level: 'thigh', vector: [['front-thigh', -1], ['back-thigh', -1]], stage: 5, seam: 'girth', pieces: ['front', 'back'], operators: ['take-in-taper'], keep: ['hip notch', 'knee'], true: ['the run at hip and knee'], walk: ['side seams'],
    mistakes: ['It eats crotch length', 'One piece only'],
  }),
  correction({
    id: 'take-in-waist-back', name: 'Take in the waist behind at the side', group: 'waist', description: 'Take in the back at the side of the waist, to nothing at the high hip.',
    amounts: [3, 3, 6, 12], basis: 'edge', edges: 2, level: 'waist', vector: [['waist-back', -2]], stage: 7, seam: 'girth', pieces: ['back', 'waistband'], operators: ['take-in-taper'], keep: ['hip'], true: ['the run of the waist'], walk: ['waistband'],
    mistakes: ['Carried below the high hip', 'The gape was back rise'], sources: ['trousers:TC081'],
  }),
  correction({
    id: 'narrow-back', name: 'Narrow the back', group: 'hip', description: 'Fold a long tuck down the back beside the grain line.',
    amounts: [3, 6, 10, 19], basis: 'piece', level: 'hip', vector: [['hip-back', -2], ['back-thigh', -1]], stage: 5, seam: 'girth', pieces: ['back'], operators: ['parallel-tuck'], keep: ['front', 'side length', 'dart intake'], true: ['waist', 'hem', 'grain in the middle again'], walk: ['waistband'],
    mistakes: ['The knee shrinks unseen', 'The grain is left off the middle'],
  }),
  correction({
    id: 'straighten-waistband', name: 'Curve the waistband less', group: 'waistband', description: 'Slash the band from its top edge and spread there, in several places.',
    amounts: [3, 8, 16, 30], basis: 'round', level: 'waist', vector: [['waistband-contour', -1]], stage: 7, seam: 'other', pieces: ['waistband'], operators: ['contour-band'], keep: ['the lower edge', 'the overlap at centre front'], true: ['both edges smooth'], walk: ['band to trousers'],
    mistakes: ['The lower edge is lengthened too', 'The waist itself was too small'],
  }),
  correction({
    id: 'let-out-back-inseam', name: 'Let out the back inseam at the top', group: 'thigh', description: 'Let out the back inseam over its top 250 to 300 mm, point kept.',
    amounts: [3, 5, 10, 16], basis: 'edge', edges: 1, level: 'thigh', vector: [['back-thigh', 1]], stage: 1, seam: 'girth', neverWith: ['extend-back-point', 'shorten-back-point'], pieces: ['back'], operators: ['let-out-taper'],
    keep: ['the point', 'the front inseam', 'knee'], true: ['the run of the inseam'], walk: ['the inseam keeps its drafted ease'], mistakes: ['The point itself was short', 'Let out to the knee'], sided: true,
  }),
]; // prettier-ignore
