import type { ShapeNote } from '../schema';
import { shape } from './build';

/** How a wearer differs from what drafts assume. A note leans a prior by a factor of two at the most, and never against what the cloth says. */
export const shapeNotes: ShapeNote[] = [
  shape('rounded-front', 'A rounded front', 'Drafts assume a flatter front.', ['full abdomen', 'belly', 'tummy', 'stout'], [['waist-front', 'more', 0.6], ['abdomen-width', 'more', 0.7], ['front-rise', 'more', 0.6], ['front-slope', 'more', 0.5]], 'trousers:TC012'),
  shape('band-below-rounded-front', 'A rounded front, the band worn below it', 'The front rise then is shorter than drafted.', ['under the belly'], [['front-rise', 'less', 0.6], ['abdomen-width', 'more', 0.4]], 'trousers:TC076'),
  shape('shallow-front', 'A shallow front', 'Drafts assume a rounder front.', ['flat abdomen'], [['front-rise', 'less', 0.5], ['abdomen-width', 'less', 0.5], ['front-slope', 'less', 0.4]]),
  shape('round-seat', 'A round seat', 'Drafts assume a shallower seat.', ['full seat', 'big bum'], [['back-rise', 'more', 0.7], ['back-extension', 'more', 0.6], ['hip-back', 'more', 0.5], ['back-slope', 'more', 0.5], ['waist-back', 'less', 0.4]]),
  shape('shallow-seat', 'A shallow seat', 'Drafts assume a rounder seat.', ['flat seat', 'flat bum'], [['back-rise', 'less', 0.5], ['back-slope', 'less', 0.6], ['back-extension', 'less', 0.5], ['hip-back', 'less', 0.4], ['under-seat-length', 'less', 0.5]]),
  shape('low-seat', 'A low seat', 'The fullest place of the seat lies lower than drafted.', ['dropped seat'], [['back-curve', 'more', 0.7], ['under-seat-length', 'less', 0.5], ['back-dart-point', 'more', 0.5]], 'trousers:TF010'),
  shape('high-round-seat', 'A high round seat', 'The fullest place of the seat lies higher than drafted.', ['high seat'], [['back-dart-point', 'less', 0.6], ['crotch-depth', 'less', 0.4], ['back-rise', 'more', 0.5]], 'trousers:TC027'),
  shape('hollow-above-seat', 'Hollow above the seat', 'The small of the back lies deeper than drafted. Prints disagree on what that asks of the rise, so it says nothing of it.', ['sway back'], [['waist-back', 'less', 0.6], ['waistband-contour', 'more', 0.6]], 'trousers:TC055'),
  shape('hips-forward', 'Hips held forward', 'The pelvis is tucked under in standing.', ['tucked pelvis'], [['front-rise', 'more', 0.4], ['front-thigh', 'more', 0.4], ['back-rise', 'less', 0.5], ['back-slope', 'less', 0.5], ['under-seat-length', 'less', 0.5]]),
  shape('seat-out', 'Seat held out', 'The pelvis is tipped forward in standing.', ['tilted pelvis', 'lordosis'], [['back-rise', 'more', 0.5], ['back-slope', 'more', 0.5], ['front-rise', 'less', 0.5]]),
  shape('waist-lower-in-front', 'The waist lies lower in front', 'Drafts assume a level waist.', ['tilted waist'], [['front-rise', 'less', 0.6], ['back-rise', 'more', 0.6]]),
  shape('waist-as-wide-as-hip', 'Waist about as wide as hip', 'Drafts assume a narrower waist.', ['straight', 'stout', 'rectangle'], [['waist-front', 'more', 0.6], ['waist-back', 'more', 0.5], ['waistband-contour', 'less', 0.5]]),
  shape('full-at-side-waist', 'Full at the side of the waist', 'The fork may cut though the depth is right.', ['spare tyre'], [['waist-front', 'more', 0.5], ['waist-back', 'more', 0.5], ['high-hip-curve', 'more', 0.6]], 'trousers:TF027'),
  shape('wide-at-hip-bone', 'Wide at the hip bone', 'Wider above the hip line than drafted.', ['high hip shelf'], [['high-hip-curve', 'more', 0.7], ['side-rise', 'more', 0.3]]),
  shape('wide-below-hip-line', 'Wide below the hip line', 'Widest at the thigh.', ['low hip', 'saddlebags'], [['front-thigh', 'more', 0.5], ['back-thigh', 'more', 0.5], ['high-hip-curve', 'less', 0.5]]),
  shape('strong-front-thigh', 'A strong front thigh', 'More thigh in front than drafted.', ['big quads', 'cyclist'], [['front-thigh', 'more', 0.7], ['front-extension', 'more', 0.3]], 'trousers:TF042'),
  shape('full-inner-thigh', 'A full inner thigh', 'More thigh inside than drafted.', ['thick thighs'], [['front-extension', 'more', 0.5], ['back-extension', 'more', 0.6]]),
  shape('slim-thigh-under-full-hip', 'A slim thigh under a wide hip', 'Less back thigh than drafted for this hip.', [], [['back-thigh', 'less', 0.6], ['under-seat-length', 'less', 0.5]]),
  shape('knees-near-feet-apart', 'Knees near, feet apart', 'Drafts assume a straight leg.', ['knock knees'], [['knee-shift', 'more', 0.7], ['leg-swing', 'less', 0.5], ['knee-girth', 'more', 0.3]], 'trousers:TF030'),
  shape('knees-apart', 'Knees apart', 'Drafts assume a straight leg.', ['bow legs'], [['knee-shift', 'less', 0.7], ['leg-swing', 'more', 0.5]]),
  shape('knees-pressed-back', 'Knees pressed back', 'The leg bends backward in standing.', ['hyperextended'], [['back-leg-length', 'less', 0.7], ['calf-girth', 'more', 0.4]], 'trousers:TC059'),
  shape('strong-calf', 'A strong calf', 'More calf than drafted.', ['big calves'], [['calf-girth', 'more', 0.7], ['hem-width', 'more', 0.5]], 'trousers:TF032', 'trousers:TF033'),
  shape('long-between-waist-and-seat', 'Long between waist and seat', 'More depth than drafted.', ['long rise', 'long body'], [['crotch-depth', 'more', 0.7]]),
  shape('short-between-waist-and-seat', 'Short between waist and seat', 'Less depth than drafted.', ['short rise', 'petite'], [['crotch-depth', 'less', 0.7]]),
  { ...shape('left-hip-higher', 'The left hip stands higher', 'Drafts assume two alike.', ['uneven hips'], []), leans: [{ to: 'side-rise', direction: 'more', logOdds: 0.7, side: 'left' }] },
  { ...shape('right-hip-higher', 'The right hip stands higher', 'Drafts assume two alike.', ['uneven hips'], []), leans: [{ to: 'side-rise', direction: 'more', logOdds: 0.7, side: 'right' }] },
  { ...shape('mostly-seated', 'Mostly seated', 'Sitting wants more behind and less in front.', ['wheelchair'], [['back-rise', 'more', 0.7], ['front-rise', 'less', 0.7], ['leg-length', 'more', 0.6], ['under-seat-length', 'more', 0.4]], 'W4'), fittedFor: 'seated' },
]; // prettier-ignore
