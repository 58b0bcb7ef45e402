import { describe, expect, it } from 'vitest';
import { figureGarment, figureZones } from '@/diagnosis/figure/figure';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import { knowledgeSchema } from '@/diagnosis/garments/schema';
import type { Direction, Link } from '@/diagnosis/garments/schema';
import { trousers } from '@/diagnosis/garments/trousers';
import { AMOUNT_TABLE } from './cases/amount-table';
import { SOURCE_IDS } from './cases/source-ids';

const { dimensions, causes, signs, checks, corrections, shape, sums } = trousers;
const dimensionIds = new Set(dimensions.map(({ id }) => id));
const causeIds = new Set(causes.map(({ id }) => id));
const checkLinks = checks.flatMap(({ outcomes }) => outcomes.flatMap(({ links }) => links));
const links = [...signs.flatMap((sign) => sign.links), ...checkLinks];
const reaches = (from: readonly Link[], to: string, direction?: Direction) =>
  from.some((link) => link.to === to && link.direction === direction);
const bothWays = dimensions.flatMap(({ id }) => [[id, 'more'] as const, [id, 'less'] as const]);

describe('the knowledge of trousers', () => {
  it('has the shape that the engine reads', () => {
    expect(() => knowledgeSchema.parse(trousers)).not.toThrow();
  });

  it('is as large as a fitter needs', () => {
    expect(dimensions.length).toBeGreaterThanOrEqual(30);
    expect(causes.length).toBeGreaterThanOrEqual(11);
    expect(signs.length).toBeGreaterThanOrEqual(70);
    expect(checks.length).toBeGreaterThanOrEqual(45);
    expect(corrections.length).toBeGreaterThanOrEqual(45);
    expect(shape.length).toBeGreaterThanOrEqual(25);
  });

  it('uses each id and alias once, across every kind', () => {
    const things = [dimensions, causes, signs, checks, corrections, shape, sums].flat();
    const ids = things.flatMap((thing) => [thing.id, ...('aliases' in thing ? (thing.aliases ?? []) : [])]);
    expect(ids.filter((id, i) => ids.indexOf(id) !== i)).toEqual([]);
  });

  it('links only what there is, with a direction for a need and none for a cause', () => {
    const wrong = links.filter(({ to, direction }) =>
      direction ? !dimensionIds.has(to) : !causeIds.has(to),
    );
    expect(wrong).toEqual([]);
  });

  it('names only signs, needs, causes and corrections that exist', () => {
    const signIds = new Set(signs.map(({ id }) => id));
    const correctionIds = new Set(corrections.map(({ id }) => id));
    const named = [
      ...signs.flatMap((sign) => sign.lookAlikes.map((one) => signIds.has(one.sign) || one.sign)),
      ...signs.flatMap((sign) =>
        sign.maskedBy.map(({ to }) => dimensionIds.has(to) || causeIds.has(to) || to),
      ),
      ...corrections.flatMap((one) => one.neverWith.map((id) => correctionIds.has(id) || id)),
      ...corrections.flatMap((one) =>
        one.vector.map(({ dimension }) => dimensionIds.has(dimension) || dimension),
      ),
      ...shape.flatMap((note) => note.leans.map(({ to }) => dimensionIds.has(to) || to)),
      ...checks.flatMap(({ amountTo }) =>
        amountTo ? [dimensionIds.has(amountTo.dimension) || amountTo.dimension] : [],
      ),
    ];
    expect(named.filter((found) => found !== true)).toEqual([]);
  });

  it.each(bothWays)('shows %s, %s, by a sign and changes it by a correction', (id, direction) => {
    expect(signs.some((sign) => reaches(sign.links, id, direction))).toBe(true);
    const meets = corrections.filter(({ vector }) =>
      vector.some(
        ({ dimension, perMm, coupling }) =>
          dimension === id && !coupling && perMm > 0 === (direction === 'more'),
      ),
    );
    expect(meets.map(({ id: correction }) => correction)).not.toEqual([]);
  });

  it.each(causes.map(({ id }) => id))('shows the cause %s by a sign and settles it by a check', (id) => {
    expect(signs.some((sign) => reaches(sign.links, id))).toBe(true);
    expect(reaches(checkLinks, id)).toBe(true);
  });

  it('keeps step, first amount, stop of a round and stop in total in order', () => {
    const wrong = corrections.flatMap(({ id, amounts }) => {
      if (!amounts) return [];
      const { stepMm, firstMm, capRoundMm, capTotalMm } = amounts;
      return stepMm <= firstMm && firstMm <= capRoundMm && capRoundMm <= capTotalMm ? [] : [id];
    });
    expect(wrong).toEqual([]);
  });

  it.each(AMOUNT_TABLE)('gives %s the amounts of the fitter’s table', (id, amounts) => {
    const found = corrections.find((one) => one.id === id)!.amounts!;
    expect([found.stepMm, found.firstMm, found.capRoundMm, found.capTotalMm]).toEqual(amounts);
  });

  it('cites only published ids that are there', () => {
    const known = new Set(
      Object.entries(SOURCE_IDS).flatMap(([file, groups]) =>
        Object.entries(groups).flatMap(([letters, numbers]) =>
          numbers.split(' ').map((number) => `${file}:${letters}${number}`),
        ),
      ),
    );
    const cited = [
      ...links.flatMap(({ sources }) => sources),
      ...[dimensions, causes, signs, checks, corrections, shape, sums]
        .flat()
        .flatMap(({ sources }) => sources),
      ...corrections.flatMap(({ amounts }) => amounts?.sources ?? []),
    ];
    const unknown = cited.filter(
      (source) => source !== 'common practice' && !/^W([1-9]|10)$/.test(source) && !known.has(source),
    );
    expect([...new Set(unknown)]).toEqual([]);
  });

  it('draws each template where the figure has its zones and landmarks', () => {
    const wrong = signs.flatMap(({ id, template, views, tension }) => {
      if (!template) return tension === 'feel' ? [] : [`${id}: no template`];
      const drawn = views.flatMap((view) => (view === 'close-up' ? [] : [view]));
      const zones = new Set(
        drawn.flatMap((view) => figureZones(view, REFERENCE_PROPORTIONS).map(({ zone }) => zone)),
      );
      const marks = new Set(
        drawn.flatMap((view) =>
          figureGarment(view, REFERENCE_PROPORTIONS).landmarks.map(({ name }) => String(name)),
        ),
      );
      const missing = [
        ...template.zones.filter((zone) => !zones.has(zone)),
        ...[template.anchor, template.target].filter((name) => name !== null && !marks.has(name)),
      ];
      return missing.map((one) => `${id}: ${one}`);
    });
    expect(wrong).toEqual([]);
  });

  it('shows no word that blames a body or names a line for a mouth', () => {
    const shown = [
      ...[dimensions, causes, signs, shape].flat().flatMap(({ name, description }) => [name, description]),
      ...checks.flatMap(({ name, question, how, outcomes }) => [
        name,
        question,
        how,
        ...outcomes.map((one) => one.name),
      ]),
      ...corrections.flatMap(({ name, description, mistakes }) => [name, description, ...mistakes]),
    ];
    const forbidden =
      /\b(smil\w*|frown\w*|wedgie|camel|whisker\w*|baggy|saddlebag\w*|sway ?back|knock|bow legs?|stout|flat seat|problem|normal|abnormal|flaw|figure fault|fat|she|her)\b/i;
    expect(shown.filter((text) => forbidden.test(text))).toEqual([]);
  });

  it('never lets a shape note move a belief by more than a factor of two, nor the hollow above the seat the back rise', () => {
    expect(
      Math.max(...shape.flatMap(({ leans }) => leans.map(({ logOdds }) => logOdds))),
    ).toBeLessThanOrEqual(0.7);
    const hollow = shape.find(({ id }) => id === 'hollow-above-seat')!;
    expect(hollow.leans.map(({ to }) => to)).not.toContain('back-rise');
  });

  it('sums measures as the body does', () => {
    const terms = (id: string) =>
      Object.fromEntries(
        sums.find((sum) => sum.id === id)!.terms.map(({ dimension, weight }) => [dimension, weight]),
      );
    expect(terms('back-crotch-length')).toEqual({
      'crotch-depth': 1, 'back-rise': 1, 'back-extension': 1, 'back-curve': 0.9, 'back-slope': 0.2,
    }); // prettier-ignore
    expect(terms('front-crotch-length')).toEqual({
      'crotch-depth': 1, 'front-rise': 1, 'front-extension': 1, 'front-curve': 0.9,
    }); // prettier-ignore
  });
});
