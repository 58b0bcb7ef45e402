import type { LandmarkName } from '@/diagnosis/figure/garment';

const WORDS: Record<LandmarkName, string> = {
  'waist-centre': 'middle of the waist',
  waist: 'waist at the side',
  'waist-front': 'front of the waist',
  'waist-back': 'back of the waist',
  'high-hip': 'high hip',
  abdomen: 'fullest place in front',
  hip: 'hip',
  seat: 'fullest place of the seat',
  'under-seat': 'fold under the seat',
  fork: 'fork',
  thigh: 'thigh',
  lap: 'lap',
  knee: 'knee',
  'behind-knee': 'back of the knee',
  calf: 'calf',
  hem: 'hem',
  'hem-front': 'front of the hem',
  'hem-back': 'back of the hem',
  ankle: 'ankle',
};

const isName = (name: string): name is LandmarkName => name in WORDS;

/** A point of the figure by its id, as one would ask for it: "hip, your left". */
export function landmarkWords(id: string): string {
  const [, name = id, side] = /^(.*?)(?:-(left|right))?$/.exec(id) ?? [];
  const words = isName(name) ? WORDS[name] : name;
  return side ? `${words}, your ${side}` : words;
}
