import type { Knowledge, Sign } from '../garments/schema';
import { editDistance, fold } from './fold';

export interface FoundSign {
  sign: string;
  score: number;
}

interface Entry {
  sign: string;
  /** Every phrase that names the sign, as its words; the name and the id weigh more than the description. */
  phrases: { words: Set<string>; weight: number }[];
}

interface Index {
  entries: Entry[];
  /** How much a word tells: rare words more (inverse document frequency, Spärck Jones 1972). */
  weightOf: Map<string, number>;
}

const indexes = new WeakMap<Knowledge, Index>();

function entryOf(sign: Sign): Entry {
  const phrase = (text: string, weight: number) => ({ words: new Set(fold(text)), weight });
  return {
    sign: sign.id,
    phrases: [
      phrase(sign.name, 1.15),
      phrase(sign.id.replaceAll('-', ' '), 1),
      phrase(`${sign.name} ${sign.description} ${sign.zone.replaceAll('-', ' ')}`, 0.85),
      ...sign.synonyms.map((text) => phrase(text, 1.2)),
    ],
  };
}

function indexOf(knowledge: Knowledge): Index {
  const had = indexes.get(knowledge);
  if (had) return had;
  const entries = knowledge.signs.map(entryOf);
  const seenIn = new Map<string, number>();
  for (const { phrases } of entries) {
    for (const word of new Set(phrases.flatMap(({ words }) => [...words])))
      seenIn.set(word, (seenIn.get(word) ?? 0) + 1);
  }
  const weightOf = new Map([...seenIn].map(([word, count]) => [word, Math.log(1 + entries.length / count)]));
  const made = { entries, weightOf };
  indexes.set(knowledge, made);
  return made;
}

/** The known word that was meant: itself, or the nearest one by at most one slip (two in a long word). Null when none is near. */
function meant(word: string, weightOf: Map<string, number>): { word: string; sureness: number } | null {
  if (weightOf.has(word)) return { word, sureness: 1 };
  const most = word.length >= 8 ? 2 : word.length >= 4 ? 1 : 0;
  if (most === 0) return null;
  let best: { word: string; sureness: number } | null = null;
  let distance = most + 1;
  for (const known of weightOf.keys()) {
    const off = editDistance(word, known, Math.min(most, distance - 1));
    if (off < distance) [best, distance] = [{ word: known, sureness: 1 - 0.25 * off }, off];
  }
  return best;
}

/**
 * The signs that a phrase of everyday words may mean, best first; typos and insults are understood, and never shown back.
 * @param phrase what a person typed or said
 * @returns every sign with a score above 0 (cosine of weighted words, 0 … about 1.2)
 */
export function findSigns(knowledge: Knowledge, phrase: string): FoundSign[] {
  const { entries, weightOf } = indexOf(knowledge);
  const asked = new Map<string, number>();
  for (const word of fold(phrase.slice(0, 400))) {
    const found = meant(word, weightOf);
    if (found)
      asked.set(
        found.word,
        Math.max(asked.get(found.word) ?? 0, found.sureness * (weightOf.get(found.word) ?? 0)),
      );
  }
  const norm = Math.hypot(...asked.values());
  if (norm === 0) return [];
  const scoreOf = ({ phrases }: Entry): number => {
    let best = 0;
    let spread = 0;
    for (const { words, weight } of phrases) {
      let dot = 0;
      let length = 0;
      for (const word of words) {
        const tells = weightOf.get(word) ?? 0;
        length += tells ** 2;
        dot += tells * (asked.get(word) ?? 0);
      }
      const cosine = length === 0 ? 0 : (weight * dot) / (Math.sqrt(length) * norm);
      best = Math.max(best, cosine);
      spread += cosine;
    }
    return best + 0.12 * (spread / phrases.length);
  };
  return entries
    .map((entry) => ({ sign: entry.sign, score: scoreOf(entry) }))
    .filter(({ score }) => score > 0)
    .sort((a, b) => b.score - a.score || a.sign.localeCompare(b.sign));
}
