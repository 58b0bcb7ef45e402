import type { LineFact } from './marked-photos';

/** What print says of lines, put as places, directions and targets on the figure. */
export const LINE_FACTS: readonly LineFact[] = [
  { sign: 'taut-lines-rising-from-front-fork', source: 'trousers:TF017', view: 'front', kind: 'tight', from: { landmark: 'fork' }, toward: { landmark: 'hip' }, length: 0.42, lines: 4 },
  { sign: 'slack-lines-falling-from-front-fork', source: 'trousers:TF022', view: 'front', kind: 'slack', from: { landmark: 'fork' }, toward: { landmark: 'thigh' }, length: 0.35, lines: 4 },
  { sign: 'upright-taut-lines-beside-front-fork', source: 'trousers:TF021', view: 'front', kind: 'tight', from: { zone: 'fork-front' }, toward: { deg: 0 }, length: 0.4, lines: 4 },
  { sign: 'split-line-at-front-fork', source: 'trousers:TF020', view: 'front', kind: 'tight', from: { centre: 0.93 }, toward: { deg: 0 }, length: 0.15, lines: 2 },
  { sign: 'tight-lines-across-front-hip', source: 'trousers:TF001', view: 'front', kind: 'tight', from: { zone: 'hip-front' }, toward: { deg: 90 }, length: 0.45, lines: 4 },
  { sign: 'tight-lines-across-back-hip', source: 'trousers:TF001', view: 'back', kind: 'tight', from: { zone: 'seat' }, toward: { deg: 90 }, length: 0.6, lines: 4 },
  { sign: 'crossed-lines-at-fly', source: 'trousers:TF005', view: 'front', kind: 'tight', from: { zone: 'fly' }, toward: { deg: 50, isCrossed: true }, length: 0.4, lines: 4 },
  { sign: 'pockets-gape', source: 'trousers:TF005', view: 'front', kind: 'gap', from: { zone: 'pocket' }, toward: { deg: 20 }, length: 0.35, lines: 2 },
  { sign: 'vertical-slack-front-hip', source: 'trousers:TF002', view: 'front', kind: 'slack', from: { zone: 'hip-front' }, toward: { deg: 0 }, length: 0.5, lines: 4 },
  { sign: 'vertical-slack-seat', source: 'trousers:TF006', view: 'back', kind: 'slack', from: { zone: 'seat' }, toward: { deg: 0 }, length: 0.5, lines: 4 },
  { sign: 'fold-under-back-band', source: 'trousers:TF004', view: 'back', kind: 'slack', from: { centre: 0.2 }, toward: { deg: 90 }, length: 0.6, lines: 3 },
  { sign: 'slack-under-seat', source: 'trousers:TF010', view: 'back', kind: 'slack', from: { zone: 'under-seat' }, toward: { deg: 90 }, length: 0.45, lines: 4 },
  { sign: 'vertical-slack-back-thigh', source: 'trousers:TF012', view: 'back', kind: 'slack', from: { zone: 'thigh-back' }, toward: { deg: 0 }, length: 0.6, lines: 4 },
  { sign: 'fold-at-centre-front', source: 'trousers:TF023', view: 'front', kind: 'slack', from: { centre: 0.35 }, toward: { deg: 90 }, length: 0.5, lines: 3 },
  { sign: 'diagonal-from-inner-hem-to-front-knee', source: 'trousers:TF028', view: 'front', kind: 'slack', from: { landmark: 'hem', inward: 0.2 }, toward: { landmark: 'knee' }, length: 1, lines: 3 },
  { sign: 'calf-catches-behind', source: 'trousers:TF032', view: 'back', kind: 'tight', from: { zone: 'calf' }, toward: { deg: 90 }, length: 0.35, lines: 3 },
  { sign: 'tight-lines-front-thigh', source: 'trousers:TF042', view: 'front', kind: 'tight', from: { zone: 'thigh-front' }, toward: { deg: 90 }, length: 0.4, lines: 4 },
  { sign: 'seat-drawn-in-at-centre-back', source: 'trousers:TF054', view: 'back', kind: 'tight', from: { centre: 0.75 }, toward: { deg: 0 }, length: 0.4, lines: 3 },
  { sign: 'waist-gapes-behind', source: 'trousers:TF048', view: 'back', kind: 'gap', from: { centre: 0.1 }, toward: { deg: 90 }, length: 0.5, lines: 2 },
  { sign: 'slack-lines-falling-from-back-fork', source: 'trousers:TF018', view: 'back', kind: 'slack', from: { landmark: 'fork' }, toward: { deg: 40 }, length: 0.4, lines: 4 },
  { sign: 'taut-lines-from-back-fork-to-seat', source: 'trousers:TF017', view: 'back', kind: 'tight', from: { landmark: 'fork' }, toward: { landmark: 'hip' }, length: 0.45, lines: 4 },
  { sign: 'leg-twists-round', source: 'trousers:TF038', view: 'back', kind: 'tilt', from: { zone: 'calf' }, toward: { deg: 30 }, length: 1.1, lines: 2 },
  { sign: 'knees-pull-inward', source: 'trousers:TF030', view: 'front', kind: 'tight', from: { zone: 'inseam' }, toward: { landmark: 'knee' }, length: 0.3, lines: 3 },
]; // prettier-ignore

/** Signs that lie alike on a photo: what tells them apart is felt, tried, or seen in another pose. */
export const EQUAL_GEOMETRY: readonly (readonly string[])[] = [
  ['tight-lines-across-front-hip', 'will-not-come-over-hip'],
  ['tight-lines-across-back-hip', 'will-not-come-over-hip'],
  ['slack-under-seat', 'u-folds-under-seat', 'fold-under-one-half-of-seat', 'level-folds-down-back-leg'],
  ['waist-gapes-behind', 'band-top-edge-off', 'band-slides-down'],
];
