import type { Zone } from '@/diagnosis/garments/schema';
import type { ZoneAt } from '@/diagnosis/figure/figure';

const WORDS: Record<Zone, string> = {
  'waist-front': 'front waist',
  'waist-back': 'back waist',
  'waist-side': 'side waist',
  abdomen: 'abdomen',
  'high-hip-side': 'side above the hip',
  'hip-front': 'front hip',
  'hip-back': 'back hip',
  'hip-side': 'side hip',
  'fork-front': 'front fork',
  'fork-back': 'back fork',
  seat: 'seat',
  'under-seat': 'under the seat',
  'inner-thigh': 'inner thigh',
  'thigh-front': 'front thigh',
  'thigh-back': 'back thigh',
  knee: 'knee',
  'behind-knee': 'behind the knee',
  calf: 'calf',
  'lower-leg': 'lower leg',
  hem: 'hem',
  'side-seam': 'side seam',
  inseam: 'inside leg seam',
  pocket: 'pocket',
  fly: 'fly',
  waistband: 'waistband',
};

/** What a zone is called to the wearer: "seat, your left". */
export function zoneWords({ zone, side }: ZoneAt): string {
  return side === null ? WORDS[zone] : `${WORDS[zone]}, your ${side}`;
}
