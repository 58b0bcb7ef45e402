import { zoneWords } from '@/components/figure/zone-words';
import { VIEW_WORDS } from '@/components/photos/view-words';
import type { View } from '@/diagnosis/garments/schema';
import type { Reason } from '@/diagnosis/photo/template-fit';
import { landmarkWords } from './landmark-words';

/** Degrees from plumb in words, as one sees them without a protractor. */
export function directionWords(angleDeg: number): string {
  const lean = Math.min(angleDeg, 180 - angleDeg);
  if (lean <= 15) return 'it runs up and down';
  if (lean >= 75) return 'it runs level';
  return angleDeg < 90 ? 'it falls outward' : 'it rises outward';
}

function reasonWords(reason: Reason): string {
  switch (reason.kind) {
    case 'zone':
      return `it lies at the ${zoneWords({ zone: reason.zone, side: null })}`;
    case 'direction':
      return `${directionWords(reason.angleDeg)} (${Math.round(Math.min(reason.angleDeg, 180 - reason.angleDeg))}° from plumb)`;
    case 'anchor':
      return `it comes from the ${landmarkWords(reason.landmark)}`;
    case 'target':
      return `it points to the ${landmarkWords(reason.landmark)}`;
    case 'meeting':
      return `${reason.lines} of your lines meet near the ${landmarkWords(reason.landmark)}`;
    case 'views':
      return `it shows in several photos: ${reason.views.map((view) => VIEW_WORDS[view as View].toLowerCase()).join(', ')}`;
  }
}

/** Why a sign is offered, as one sentence: "It lies at the front fork, rises outward and points to the hip." */
export function whyWords(why: readonly Reason[]): string {
  const parts = why.map(reasonWords);
  const said = parts.map((part, i) => (i > 0 ? part.replace(/^it (?!is)/, '') : part));
  const sentence = said.length > 1 ? `${said.slice(0, -1).join(', ')} and ${said.at(-1)}` : (said[0] ?? '');
  return sentence ? `${sentence[0]!.toUpperCase()}${sentence.slice(1)}.` : '';
}
