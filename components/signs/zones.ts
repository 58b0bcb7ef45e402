import type { Sign, View, Zone } from '@/diagnosis/garments/schema';

/** Where to look, in the order the eye goes: from the waist down. */
export const ZONE_WORDS: Record<Zone, string> = {
  waistband: 'Waistband',
  'waist-front': 'Waist in front',
  'waist-back': 'Waist behind',
  'waist-side': 'Waist at the side',
  fly: 'Fly',
  abdomen: 'Below the waist in front',
  pocket: 'Pockets',
  'high-hip-side': 'Side above the hip',
  'hip-front': 'Hip in front',
  'hip-side': 'Hip at the side',
  'hip-back': 'Hip behind',
  seat: 'Seat',
  'under-seat': 'Under the seat',
  'fork-front': 'Fork in front',
  'fork-back': 'Fork behind',
  'inner-thigh': 'Inner thigh',
  'thigh-front': 'Thigh in front',
  'thigh-back': 'Thigh behind',
  'side-seam': 'Side seam',
  inseam: 'Inseam',
  knee: 'Knee',
  'behind-knee': 'Behind the knee',
  calf: 'Calf',
  'lower-leg': 'Lower leg',
  hem: 'Hem',
};

const ORDER = Object.keys(ZONE_WORDS) as Zone[];

export interface ZoneGroup {
  zone: Zone;
  signs: Sign[];
}

/** The signs that a view can show, by place, from the waist down. A muslin cut as shorts says nothing below the thigh. */
export function groupByZone(signs: Sign[], view: View, cut: 'full' | 'shorts'): ZoneGroup[] {
  const shown = signs.filter(
    (sign) => sign.views.includes(view) && !(cut === 'shorts' && sign.needsFullLength),
  );
  return ORDER.map((zone) => ({ zone, signs: shown.filter((sign) => sign.zone === zone) })).filter(
    (group) => group.signs.length > 0,
  );
}
