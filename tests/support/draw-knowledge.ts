import type { Knowledge } from '@/diagnosis/garments/schema';
import { GRADES } from '@/diagnosis/garments/schema';
import type { Random } from '@/diagnosis/evaluation/random';
import { check, correction, dimension, link, sign } from './small-knowledge';

export interface KnowledgeSize {
  dimensions: number;
  causes: number;
  signs: number;
  checks: number;
}

/** A random garment: signs with two to five links each, checks with two outcomes, a correction each way for every need. */
export function drawKnowledge(random: Random, size: KnowledgeSize): Knowledge {
  const dimensions = Array.from({ length: size.dimensions }, (_, i) =>
    dimension(`need-${i}`, {
      scaleMm: 6 + random.below(12),
      toleranceMm: 3 + random.below(3),
      sided: i % 4 === 3,
    }),
  );
  const causes = Array.from({ length: size.causes }, (_, i) => ({
    id: `cause-${i}`,
    name: `Cause ${i}`,
    description: 'drawn',
    prior: random.between(0.02, 0.3),
    action: 'look again',
    sources: ['common practice' as const],
  }));
  const targets = [...dimensions.map(({ id }) => id), ...causes.map(({ id }) => id)];
  const links = (from: number) => {
    const near = targets.filter((_, i) => Math.abs(i - from) < 6);
    return random.sample(near, 2 + random.below(4)).map((to) => {
      const direction = to.startsWith('need') ? random.pick(['more', 'less'] as const) : undefined;
      return link(to, direction, random.pick(GRADES));
    });
  };
  return {
    garment: 'drawn',
    name: 'Drawn',
    dimensions,
    causes,
    signs: Array.from({ length: size.signs }, (_, i) =>
      sign(`sign-${i}`, links(Math.floor((i * targets.length) / size.signs)), {
        leak: random.pick(['low', 'usual', 'high'] as const),
        sided: random.chance(0.3),
      }),
    ),
    checks: Array.from({ length: size.checks }, (_, i) =>
      check(`check-${i}`, [
        { id: 'yes', name: 'Yes', links: links(random.below(targets.length)) },
        { id: 'no', name: 'No', links: [] },
      ]),
    ),
    corrections: dimensions.flatMap(({ id, sided }) =>
      ([1, -1] as const).map((perMm) =>
        correction(`${perMm > 0 ? 'add' : 'take'}-${id}`, [{ dimension: id, perMm, coupling: false }], {
          sided,
        }),
      ),
    ),
    shape: [],
    sums: [],
  };
}
