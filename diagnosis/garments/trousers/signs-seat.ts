import type { Sign } from '../schema';
import { causeLink, link, sign } from './build';

const BACK_AND_SIDES: Sign['views'] = ['back', 'left', 'right'];
const TIGHT_THIGH = [
  { to: 'front-thigh', direction: 'more' as const },
  { to: 'back-thigh', direction: 'more' as const },
];

/** Behind: seat, fork and waist. */
export const seatSigns: Sign[] = [
  sign({ id: 'seat-drawn-in-at-centre-back', name: 'Cloth drawn in at the centre back', description: 'The centre back seam is pulled in between the halves of the seat.', group: 'seat', tension: 'tight', zone: 'fork-back', views: ['back'],
    links: [link('back-extension', 'more', 'strong', 'trousers:TF045'), link('back-rise', 'more', 'usual'), link('hip-back', 'more', 'usual'), link('back-slope', 'more', 'sometimes')], synonyms: ['wedgie', 'riding up', 'cuts into my bum', 'seam up the crack', 'splits my behind'],
    lookAlikes: [['tight-lines-across-back-hip', 'Level lines at the hip as well: then it is width.']] }),
  sign({ id: 'taut-lines-from-back-fork-to-seat', name: 'Taut lines from the back fork toward the seat', description: 'Lines fan out from the fork over the seat.', group: 'seat', tension: 'tight', zone: 'seat', views: BACK_AND_SIDES,
    links: [link('back-extension', 'more', 'strong'), link('back-curve', 'more', 'usual'), link('back-rise', 'more', 'sometimes')], synonyms: ['lines under my bum', 'pulling at the crotch from behind', 'whiskers at the back'] }),
  sign({ id: 'pull-into-inner-thighs', name: 'Lines pulling into the inner thighs', description: 'Taut lines run from the inseam at the top of the thigh toward the fork, behind.', group: 'fork', tension: 'tight', zone: 'inner-thigh', views: ['back', 'front', 'close-up'],
    links: [link('back-extension', 'more', 'defining', 'trousers:TF045'), link('back-thigh', 'more', 'usual'), link('front-extension', 'more', 'sometimes')], synonyms: ['pulls into my thighs', 'pulls towards the inside of my legs', 'tight in the crotch', 'inner thigh drag'] }),
  sign({ id: 'waist-falls-when-sitting', name: 'The back waist falls when you sit', description: 'The band drops more than 15 mm (5/8 in) behind when you sit down.', group: 'back-waist', tension: 'place', zone: 'waist-back', views: ['seated'],
    links: [link('back-rise', 'more', 'defining', 'W4'), link('back-slope', 'more', 'usual', 'trousers:TF044'), link('back-extension', 'more', 'sometimes')], synonyms: ['falls down at the back', 'slides down when I sit', 'plumber', 'shows my underwear', 'gaps when sitting'] }),
  sign({ id: 'fold-under-back-band', name: 'A fold under the back band', description: 'A level fold lies across just below the waistband behind and runs out before the side.', group: 'back-waist', tension: 'slack', zone: 'waist-back', views: BACK_AND_SIDES,
    links: [link('back-rise', 'less', 'strong'), link('hip-back', 'more', 'usual', 'trousers:TF004'), link('back-dart-point', 'more', 'sometimes', 'trousers:TC028')], synonyms: ['swayback', 'sway back', 'puddle of fabric at the back waist', 'roll under the waistband', 'wrinkle below the belt'] ,
    lookAlikes: [['fold-across-small-of-back', 'That one stands without the hip being tight.']] }),
  sign({ id: 'fold-across-small-of-back', name: 'A soft fold above the seat', description: 'A soft fold hollows above the seat, the hip below it smooth.', group: 'back-waist', tension: 'slack', zone: 'hip-back', views: BACK_AND_SIDES,
    links: [link('back-rise', 'less', 'usual'), link('waist-back', 'less', 'usual'), link('back-slope', 'less', 'sometimes')], synonyms: ['hollow back', 'bag above my bum'] }),
  sign({ id: 'waist-gapes-behind', name: 'The waist stands off behind', description: 'The band stands away from the back, standing and sitting alike.', group: 'back-waist', tension: 'gap', zone: 'waist-back', views: ['back', 'left', 'right', 'seated'],
    links: [link('waist-back', 'less', 'strong', 'trousers:TF048'), link('waistband-contour', 'more', 'usual'), link('back-rise', 'more', 'sometimes'), link('back-slope', 'more', 'rare')], synonyms: ['gaps at the waist', 'gape at the back', 'waistband gap', 'too big in the back waist', 'gapes at the back'] }),
  sign({ id: 'band-top-edge-off', name: 'The top edge of the band stands off', description: 'The lower edge lies close, the top edge does not.', group: 'waistband', tension: 'gap', zone: 'waistband', views: ['back', 'left', 'right', 'close-up'],
    links: [link('waistband-contour', 'more', 'defining'), link('waist-back', 'less', 'sometimes')], synonyms: ['waistband flips out', 'band sticks out at the top'] }),
  sign({ id: 'band-top-edge-digs-in', name: 'The top edge of the band digs in', description: 'The top edge presses, the lower edge is loose.', group: 'waistband', tension: 'tight', zone: 'waistband', views: ['front', 'back', 'left', 'right'],
    links: [link('waistband-contour', 'less', 'strong'), link('waist-front', 'more', 'usual')], synonyms: ['muffin top', 'waistband cuts in', 'digs into my belly'] }),
  sign({ id: 'slack-under-seat', name: 'Slack folds under the seat', description: 'Soft folds hang below the seat and across the top of the back leg.', group: 'under-seat', tension: 'slack', zone: 'under-seat', views: BACK_AND_SIDES, leak: 'high',
    links: [link('crotch-depth', 'less', 'usual', 'trousers:TC022'), link('back-rise', 'less', 'sometimes'), link('back-slope', 'less', 'usual', 'trousers:TC010'), link('under-seat-length', 'less', 'usual', 'trousers:TC059'), link('back-thigh', 'less', 'usual', 'trousers:TF012'), link('back-extension', 'less', 'sometimes'), causeLink('stance', 'usual', 'trousers:TC070')],
    synonyms: ['baggy bum', 'saggy bottom', 'bags under my butt', 'diaper', 'loose under the seat', 'fabric smiles under the butt'], maskedBy: TIGHT_THIGH,
    lookAlikes: [['taut-lines-from-back-fork-to-seat', 'Those are pulled tight, not hanging.']] }),
  sign({ id: 'vertical-slack-back-thigh', name: 'Loose upright folds down the back thigh', description: 'Folds stand upright on the back of the thigh and can be pinched.', group: 'thigh', tension: 'slack', zone: 'thigh-back', views: BACK_AND_SIDES, sided: true,
    links: [link('back-thigh', 'less', 'strong', 'trousers:TF012'), link('back-extension', 'less', 'usual'), link('hip-back', 'less', 'sometimes')], synonyms: ['too much fabric on the back of my leg', 'loose back thigh'] }),
  sign({ id: 'slack-lines-falling-from-back-fork', name: 'Slack lines falling from the back fork', description: 'Soft lines fall from the fork down the back inner thigh.', group: 'under-seat', tension: 'slack', zone: 'fork-back', views: ['back'],
    links: [link('back-extension', 'less', 'strong'), link('back-slope', 'less', 'usual'), link('back-curve', 'more', 'sometimes', 'trousers:TF010')], synonyms: ['frown lines', 'droopy lines from the crotch at the back'], maskedBy: TIGHT_THIGH }),
  sign({ id: 'vertical-slack-seat', name: 'Loose upright folds over the seat', description: 'The seat is wide: cloth can be pinched upright at centre back.', group: 'seat', tension: 'slack', zone: 'seat', views: BACK_AND_SIDES,
    links: [link('hip-back', 'less', 'strong', 'trousers:TC084'), link('back-slope', 'less', 'sometimes'), link('back-thigh', 'less', 'sometimes')], synonyms: ['flat bum', 'empty seat', 'no bottom to fill it'] }),
  sign({ id: 'tight-lines-across-back-hip', name: 'Tight level lines across the back hip', description: 'Taut lines run level from side to side over the seat.', group: 'hip', tension: 'tight', zone: 'hip-back', views: BACK_AND_SIDES,
    links: [link('hip-back', 'more', 'defining', 'trousers:TF001'), link('back-rise', 'more', 'rare')], synonyms: ['too tight over my bum', 'horizontal wrinkles at the hips', 'stretched over the seat'] }),
  sign({ id: 'dart-bubble', name: 'A bubble at the end of the back dart', description: 'A small bag of cloth stands at the dart point.', group: 'dart', tension: 'slack', zone: 'hip-back', views: ['back', 'close-up'], sided: false,
    links: [link('back-dart-point', 'more', 'strong', 'trousers:TF048'), link('waist-back', 'more', 'sometimes')], synonyms: ['pointy dart', 'nipple at the dart'] }),
]; // prettier-ignore
