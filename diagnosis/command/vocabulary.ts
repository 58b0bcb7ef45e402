import type { Direction, Knowledge, Link } from '../garments/schema';
import { engineVersion } from '../version';

/** Every id of a garment with its name and description, and what a case needs to know to use it. */
export function vocabularyOf(knowledge: Knowledge) {
  const causes = new Set(knowledge.causes.map(({ id }) => id));
  const target = ({ to, direction }: { to: string; direction?: Direction }) =>
    causes.has(to) ? { cause: to } : { dimension: to, direction };
  return {
    engine: engineVersion(knowledge),
    garments: [{ id: knowledge.garment, name: knowledge.name, description: knowledge.name }],
    dimensions: knowledge.dimensions.map((one) => ({
      id: one.id,
      name: one.name,
      description: one.description,
      sided: one.sided,
      scaleMm: one.scaleMm,
      toleranceMm: one.toleranceMm,
      directions: ['more', 'less'],
      basis: one.basis,
      conversions: one.conversions,
      sizeLevel: one.sizeLevel,
    })),
    causes: knowledge.causes.map(({ id, name, description, action }) => ({ id, name, description, action })),
    signs: knowledge.signs.map((one) => ({
      id: one.id,
      name: one.name,
      description: one.description,
      views: one.views,
      synonyms: one.synonyms,
      sided: one.sided,
      links: one.links.map((link: Link) => ({ ...target(link), grade: link.grade })),
      maskedBy: one.maskedBy.map(target),
    })),
    checks: knowledge.checks.map((one) => ({
      id: one.id,
      name: one.name,
      description: `${one.question} ${one.how}`,
      sided: one.sided,
      outcomes: one.outcomes.map((outcome) => ({ id: outcome.id, name: outcome.name })),
      amount: one.amount,
      effort: one.effort,
    })),
    corrections: knowledge.corrections.map((one) => ({
      id: one.id,
      name: one.name,
      description: one.description,
      sided: one.sided,
      vector: one.vector,
      basis: one.amounts?.basis ?? null,
      firstMm: one.amounts?.firstMm ?? null,
      capRoundMm: one.amounts?.capRoundMm ?? null,
      capTotalMm: one.amounts?.capTotalMm ?? null,
    })),
    shape: knowledge.shape.map(({ id, name, description, synonyms }) => ({
      id,
      name,
      description,
      synonyms,
    })),
  };
}
