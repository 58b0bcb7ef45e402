import type { Proportions } from '@/diagnosis/figure/proportions';
import type { View } from '@/diagnosis/garments/schema';
import type { MuslinInput } from '../queries/rounds';
import type { FoldWish } from './photos/folds';
import type { Cloth } from './photos/shade';

/** A change decided after a round: planned by the tape, and what was really made of it. */
export interface DemoChange {
  correction: string;
  plannedMm: number;
  madeMm: number | null;
}

export interface DemoRound {
  begun: 'new-cloth' | 're-baste' | 'patch';
  wornOn: string;
  note: string;
  hangsClean?: boolean;
  photos: { view: Extract<View, 'front' | 'back' | 'left' | 'right' | 'seated'>; folds: FoldWish[] }[];
  signs: [sign: string, severity: 0 | 1 | 2 | 3][];
  checks: [check: string, outcome: string][];
  causes: [cause: string, isPresent: boolean][];
  changes: DemoChange[];
}

export interface DemoGarment {
  name: string;
  wearer: { name: string; isSelf: boolean; shape: string[]; agreedOn: string | null };
  measures: { measure: string; typed: string }[];
  pattern: { name: string; maker: string; notes: string };
  muslin: MuslinInput;
  proportions: Partial<Proportions>;
  photoCloth: Cloth;
  rounds: DemoRound[];
}

const RULED_OUT: [string, boolean][] = [
  ['curve-allowance-untrimmed', false],
  ['not-at-level', false],
];

/** A wool wide leg: over-long in front and loose behind, settled in three rounds. */
const wideLeg: DemoGarment = {
  name: 'Grey wool wide leg',
  wearer: { name: 'Wren', isSelf: true, shape: ['shallow-front'], agreedOn: null },
  measures: [
    { measure: 'waist', typed: '78,5 cm' },
    { measure: 'hip', typed: '101 cm' },
    { measure: 'thigh', typed: '58 cm' },
  ],
  pattern: { name: 'Canal wide leg', maker: 'My own draft', notes: 'Two pleats, straight band, side pockets.' },
  muslin: { cut: 'full', cloth: 'Old curtain, wool-like weight', clothKind: 'woven', stretchPercent: 0, isOnGrain: true, size: '14', isStraightFromDraft: true },
  proportions: { hip: 1.02, waist: 0.98, seat: -0.35 },
  photoCloth: 'grey-wool',
  rounds: [
    {
      begun: 'new-cloth', wornOn: '2026-09-12', note: 'Comfortable, but the front hangs and I hold it up when I walk.',
      photos: [
        { view: 'front', folds: [{ sign: 'slack-from-front-fork', strength: 3 }] },
        { view: 'back', folds: [{ sign: 'slack-under-seat', strength: 2 }, { sign: 'gaping-waist-back', strength: 3 }] },
      ],
      signs: [
        ['slack-lines-falling-from-front-fork', 3], ['fold-at-centre-front', 2], ['waist-gapes-behind', 3], ['slack-under-seat', 2],
        ['fork-hangs-low', 1], ['tight-lines-across-back-hip', 0], ['pull-into-inner-thighs', 0], ['pockets-gape', 0],
      ],
      checks: [['pin-fold-at-centre-front', 'clear'], ['gap-standing-and-sitting', 'same'], ['rock-the-pelvis', 'stay']],
      causes: RULED_OUT,
      changes: [{ correction: 'lower-centre-front', plannedMm: 10, madeMm: 10 }, { correction: 'deepen-back-dart', plannedMm: 6, madeMm: 6 }],
    },
    {
      begun: 're-baste', wornOn: '2026-09-19', note: 'Much calmer in front. Sitting is easy.',
      photos: [
        { view: 'front', folds: [{ sign: 'slack-from-front-fork', strength: 1 }] },
        { view: 'back', folds: [{ sign: 'slack-under-seat', strength: 2 }, { sign: 'gaping-waist-back', strength: 1 }] },
      ],
      signs: [
        ['slack-lines-falling-from-front-fork', 1], ['fold-at-centre-front', 0], ['waist-gapes-behind', 1], ['slack-under-seat', 2],
        ['vertical-slack-back-thigh', 2], ['fork-hangs-low', 0], ['tight-lines-across-back-hip', 0],
      ],
      checks: [['pinch-back-thigh', 'clears'], ['lift-band-all-round', 'do-not-clear']],
      causes: RULED_OUT,
      changes: [{ correction: 'take-in-back-inseam', plannedMm: 5, madeMm: 4 }],
    },
    {
      begun: 're-baste', wornOn: '2026-09-27', note: 'Walked, sat, climbed the stairs. I would cut the wool from this.', hangsClean: true,
      photos: [
        { view: 'front', folds: [] },
        { view: 'back', folds: [{ sign: 'slack-under-seat', strength: 1 }] },
      ],
      signs: [
        ['slack-lines-falling-from-front-fork', 0], ['fold-at-centre-front', 0], ['waist-gapes-behind', 0], ['slack-under-seat', 1],
        ['vertical-slack-back-thigh', 0], ['fork-hangs-low', 0],
      ],
      checks: [], causes: RULED_OUT, changes: [],
    },
  ],
}; // prettier-ignore

/** Linen for someone else: tight across the hip, pockets standing open; one round in, one waiting to be read. */
const linenPair: DemoGarment = {
  name: 'Linen pair for J.',
  wearer: { name: 'J.', isSelf: false, shape: ['round-seat'], agreedOn: '2026-10-02' },
  measures: [
    { measure: 'waist', typed: '92 cm' },
    { measure: 'hip', typed: '124 cm' },
  ],
  pattern: { name: 'Straight pair no. 3', maker: 'Allotment Patterns', notes: 'Slant pockets, contoured band.' },
  muslin: { cut: 'shorts', cloth: 'Bed sheet', clothKind: 'woven', stretchPercent: 0, isOnGrain: true, size: '22', isStraightFromDraft: true },
  proportions: { hip: 1.28, waist: 1.2, seat: 0.5, thigh: 1.15 },
  photoCloth: 'linen',
  rounds: [
    {
      begun: 'new-cloth', wornOn: '2026-10-04', note: 'J. says it holds at the hip and pulls when bending.',
      photos: [
        { view: 'front', folds: [{ sign: 'tight-across-hip', strength: 3 }] },
        { view: 'back', folds: [{ sign: 'tight-across-hip', strength: 2 }] },
      ],
      signs: [
        ['tight-lines-across-front-hip', 3], ['tight-lines-across-back-hip', 2], ['pockets-gape', 3], ['slack-under-seat', 0], ['waist-gapes-behind', 0],
      ],
      checks: [['pin-pocket-shut', 'lines'], ['pinch-sides-at-hip', 'none']],
      causes: RULED_OUT,
      changes: [{ correction: 'let-out-hip-side', plannedMm: 6, madeMm: 6 }],
    },
    {
      begun: 're-baste', wornOn: '2026-10-11', note: 'Better; the back waist drops when J. sits.',
      photos: [
        { view: 'front', folds: [{ sign: 'tight-across-hip', strength: 1 }] },
        { view: 'back', folds: [{ sign: 'drawn-in-centre-back', strength: 2 }] },
        { view: 'seated', folds: [{ sign: 'back-band-pulled-down', strength: 3 }] },
      ],
      signs: [
        ['tight-lines-across-front-hip', 1], ['tight-lines-across-back-hip', 0], ['pockets-gape', 1], ['waist-falls-when-sitting', 3], ['seat-drawn-in-at-centre-back', 2],
      ],
      checks: [['sit-and-mark-band', 'over-15-mm']],
      causes: RULED_OUT,
      changes: [{ correction: 'wedge-into-back', plannedMm: 12, madeMm: null }],
    },
  ],
}; // prettier-ignore

export const DEMO_GARMENTS = [wideLeg, linenPair];
