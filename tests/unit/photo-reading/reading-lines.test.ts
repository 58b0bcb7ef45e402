import { describe, expect, it } from 'vitest';
import { placeFigure } from '@/diagnosis/figure/align';
import { landmarks } from '@/diagnosis/figure/figure';
import { REFERENCE_PROPORTIONS } from '@/diagnosis/figure/proportions';
import { trousers } from '@/diagnosis/garments/trousers';
import { bodyMark } from '@/diagnosis/photo/body-mark';
import { offerSigns } from '@/diagnosis/photo/offer-signs';
import { readFigure } from '@/diagnosis/photo/read-figure';
import { EQUAL_GEOMETRY, LINE_FACTS } from '../../support/line-facts';
import { BODIES, markedPhoto, type MarkedPhoto } from '../../support/marked-photos';
import { importsOf, SOURCES } from '../../support/sources';

const PHOTOS = 200;
const TAPPED = ['waist-centre', 'fork'];

/** Reads it as a person would have it read: two taps on the reference figure, no knowledge of the body. */
function offered({ frame, shown, marks }: MarkedPhoto): string[] {
  const figure = readFigure(frame.view, REFERENCE_PROPORTIONS);
  const own = landmarks(frame.view, REFERENCE_PROPORTIONS);
  const placement = placeFigure(
    frame,
    TAPPED.map((id) => ({
      figure: own.find((one) => one.id === id)!.at,
      photo: shown.find((one) => one.id === id)!.at,
    })),
  );
  const offers = offerSigns(trousers.signs, [figure], marks.map((mark) => bodyMark(figure, placement!, mark))); // prettier-ignore
  return [...new Set(offers.map(({ sign }) => sign))];
}

describe('reading 200 marked photos', () => {
  const places = Array.from({ length: PHOTOS }, (_, i) => {
    const fact = LINE_FACTS[i % LINE_FACTS.length]!;
    const photo = markedPhoto(fact, BODIES[i % BODIES.length]!, 70_000 + i);
    const alike = new Set([fact.sign, ...EQUAL_GEOMETRY.filter((group) => group.includes(fact.sign)).flat()]);
    return offered(photo).findIndex((sign) => alike.has(sign));
  });
  const share = (isIn: (place: number) => boolean) => places.filter(isIn).length / PHOTOS;

  it('offers the true sign first in at least 80 of 100', () => {
    expect(share((place) => place === 0)).toBeGreaterThanOrEqual(0.8);
  });

  it('offers it among the first three in at least 95 of 100', () => {
    expect(share((place) => place >= 0 && place < 3)).toBeGreaterThanOrEqual(0.95);
  });
});

describe('the photos are made without the answers', () => {
  it('from no template and nothing that reads lines', () => {
    const makers = SOURCES.filter(({ path }) => /tests\/support\/(marked-photos|line-facts)\.ts$/.test(path));
    expect(makers).toHaveLength(2);
    const imported = makers.flatMap(importsOf);
    expect(imported).toContain('diagnosis/figure/figure');
    const answers = imported.filter((path) => /garments\/trousers|template|offer-signs|bundle/.test(path));
    expect(answers).toEqual([]);
    expect(makers.filter(({ text }) => /template/i.test(text.replace(/nothing of how.*$/m, '')))).toEqual([]);
  });
});
