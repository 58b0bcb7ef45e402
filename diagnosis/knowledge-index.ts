import type { Knowledge } from './garments/schema';

/** Where each id of a garment's knowledge stands; an alias stands where its id does. */
export interface KnowledgeIndex {
  knowledge: Knowledge;
  dimensions: ReadonlyMap<string, number>;
  causes: ReadonlyMap<string, number>;
  signs: ReadonlyMap<string, number>;
  checks: ReadonlyMap<string, number>;
  corrections: ReadonlyMap<string, number>;
  shape: ReadonlyMap<string, number>;
}

const known = new WeakMap<Knowledge, KnowledgeIndex>();

/** The index of a garment's knowledge, made once. */
export function indexOf(knowledge: Knowledge): KnowledgeIndex {
  const made = known.get(knowledge) ?? {
    knowledge,
    dimensions: placesOf(knowledge.dimensions),
    causes: placesOf(knowledge.causes),
    signs: placesOf(knowledge.signs),
    checks: placesOf(knowledge.checks),
    corrections: placesOf(knowledge.corrections),
    shape: placesOf(knowledge.shape),
  };
  known.set(knowledge, made);
  return made;
}

function placesOf(things: readonly { id: string; aliases?: string[] }[]): ReadonlyMap<string, number> {
  const places = new Map<string, number>();
  things.forEach(({ id }, place) => places.set(id, place));
  things.forEach(({ aliases = [] }, place) => {
    for (const alias of aliases) if (!places.has(alias)) places.set(alias, place);
  });
  return places;
}
