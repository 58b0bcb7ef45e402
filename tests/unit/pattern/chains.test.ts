import { describe, expect, it } from 'vitest';
import { trousers } from '@/diagnosis/garments/trousers';
import { draftBlock } from '@/diagnosis/pattern/blocks/block';
import { blockMeasures } from '@/diagnosis/pattern/blocks/measures';
import { DIFFERENCES } from '@/diagnosis/pattern/chains/differences';
import { compareVector } from '@/diagnosis/pattern/chains/paper-sums';
import { runChain } from '@/diagnosis/pattern/chains/run';
import { chainOf, TROUSER_CHAINS } from '@/diagnosis/pattern/chains/trousers';

const block = draftBlock(blockMeasures());
const drawn = trousers.corrections.flatMap(({ amounts, ...correction }) =>
  amounts ? [{ ...correction, amounts }] : [],
);
const chainFor = (id: string) => chainOf(id) ?? [];

describe('every correction that has amounts', () => {
  it('has a chain, and no chain is without its correction', () => {
    expect(Object.keys(TROUSER_CHAINS).sort()).toEqual(drawn.map(({ id }) => id).sort());
  });

  it.each(drawn.map((correction) => [correction.id, correction] as const))(
    '%s is carried out by the operators that it names, on its own pieces',
    (id, { operators, pieces }) => {
      const chain = chainFor(id);
      expect([...new Set(chain.map(({ operator }) => operator))].sort()).toEqual([...operators].sort());
      for (const { piece } of chain) expect(pieces).toContain(piece);
    },
  );

  it.each(drawn.map(({ id, amounts }) => [id, amounts] as const))(
    '%s changes what it declares by exactly so much and nothing else, from one step to the stop in total',
    (id, { stepMm, firstMm, capRoundMm, capTotalMm }) => {
      for (const mm of [stepMm, firstMm, capRoundMm, capTotalMm]) {
        const broken = runChain(block, chainFor(id), mm).steps.flatMap(({ proved }) =>
          proved.filter(({ holds }) => !holds),
        );
        expect(broken, `${mm} mm`).toEqual([]);
      }
    },
  );

  it.each(drawn.map((correction) => [correction.id, correction] as const))(
    '%s: its vector says what the paper does within a tenth, or the data says why not',
    (id, { vector, amounts }) => {
      const done = runChain(block, chainFor(id), amounts.firstMm);
      const apart = compareVector(done, vector, amounts.firstMm).filter(
        (sum) => Math.abs(sum.declared - sum.drawn) > 0.1 * Math.max(1, Math.abs(sum.declared)),
      );
      expect(apart.map((sum) => sum.id).sort()).toEqual(Object.keys(DIFFERENCES[id] ?? {}).sort());
    },
  );

  it('is told in steps that name the amount', () => {
    for (const { id } of drawn)
      for (const { paper } of chainFor(id)) expect(paper.join(' '), id).toContain('{amount}');
  });
});
