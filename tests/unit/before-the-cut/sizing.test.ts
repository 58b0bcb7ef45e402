import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chartOf, type Chart } from '@/diagnosis/chart/chart';
import { parseChart } from '@/diagnosis/chart/parse-chart';
import { gradeOf, lengthAt, positionOf } from '@/diagnosis/sizing/grade';
import { sizeByLevel, sizeWords } from '@/diagnosis/sizing/levels';
import { chooseSize } from '@/diagnosis/sizing/propose';
import { bodyChart, finishedChart } from './invented-chart';

const empty: Chart = chartOf([]);
const hipMm = fc.double({ min: 700, max: 1600, noNaN: true });

describe('size by level', () => {
  it('a body at a size is that size, with its distance to the neighbours', () => {
    const [hip] = sizeByLevel(bodyChart, { hip: 1000 });
    expect(hip?.chosen).toEqual({ ordinal: 5, size: '100', steps: 0 });
    expect(hip?.neighbours.map(({ size, differenceMm }) => [size.size, Math.round(differenceMm)])).toEqual([['100', 0], ['104', 40]]); // prettier-ignore
  });

  it('half-way goes to the greater size: cloth can be taken in', () => {
    expect(sizeByLevel(bodyChart, { hip: 1020 })[0]?.chosen.size).toBe('104');
    expect(sizeByLevel(bodyChart, { hip: 1019 })[0]?.chosen.size).toBe('100');
  });

  it('anyone within a range is that size', () => {
    const { chart } = parseChart('Size\tHip\nS\t88-92\nM\t94-98\nL\t100-104', 'cm');
    for (const mm of [940, 960, 980]) expect(sizeByLevel(chart, { hip: mm })[0]?.position).toBe(1);
    expect(sizeByLevel(chart, { hip: 990 })[0]?.position).toBe(1.5);
  });

  it('a chart with a gap is read across it', () => {
    const { chart } = parseChart('Size\tHip\tThigh\n10\t96\t56\n12\t100\t\n14\t104\t60', 'cm');
    expect(lengthAt(gradeOf(chart, 'thigh')!, 1)).toBe(580);
  });

  it('where the chart stops it says so, and goes on by its last step', () => {
    const choice = chooseSize(bodyChart, empty, { hip: 1400 });
    expect(choice.levels[0]?.chosen).toEqual({ ordinal: 15, size: '132', steps: 2 });
    expect(choice.levels[0]?.chosenMm).toBe(1400);
    expect(sizeWords(choice.levels[0]!.chosen)).toBe('132 and two steps more');
    expect(choice.stops[0]).toMatch(/^Hip: this chart stops at 132\. Its last step is carried on/);
    expect(chooseSize(bodyChart, empty, { hip: 1700 }).stops[0]).toMatch(/another draft/);
  });

  // EN 13402-3 central values (B34): hips of women in steps of 4 cm to 112, then of 5.
  it('a published grade: one grade larger moves one size, and the step changes at 112', () => {
    const hips = [84, 88, 92, 96, 100, 104, 108, 112, 117, 122, 127, 132];
    const { chart } = parseChart(`Size\tHip\n${hips.map((cm) => `${cm}\t${cm}`).join('\n')}`, 'cm');
    const sizeOf = (cm: number) => sizeByLevel(chart, { hip: cm * 10 })[0]?.chosen.ordinal;
    hips.forEach((cm, i) => expect(sizeOf(cm)).toBe(i));
    expect(sizeOf(114)).toBe(7);
    expect(sizeOf(114.6)).toBe(8);
    expect(sizeOf(137)).toBe(12);
  });
});

describe('laws of sizing', () => {
  it('a body one grade larger moves one size, at every level', () => {
    fc.assert(
      fc.property(fc.double({ min: 810, max: 1270, noNaN: true }), (mm) => {
        const grade = gradeOf(bodyChart, 'hip')!;
        expect(positionOf(grade, mm + 40) - positionOf(grade, mm)).toBeCloseTo(1, 9);
      }),
    );
  });

  it('position grows with the body, and the length of a size with the size', () => {
    fc.assert(
      fc.property(hipMm, fc.double({ min: 0, max: 200, noNaN: true }), (mm, more) => {
        const grade = gradeOf(bodyChart, 'hip')!;
        expect(positionOf(grade, mm + more)).toBeGreaterThanOrEqual(positionOf(grade, mm));
        expect(lengthAt(grade, (mm + more) / 100)).toBeGreaterThanOrEqual(lengthAt(grade, mm / 100));
      }),
    );
  });

  it('position and length undo each other between the sizes', () => {
    fc.assert(
      fc.property(fc.double({ min: -3, max: 16, noNaN: true }), (ordinal) => {
        const grade = gradeOf(bodyChart, 'hip')!;
        expect(positionOf(grade, lengthAt(grade, ordinal))).toBeCloseTo(ordinal, 6);
      }),
    );
  });

  it('units never change a choice', () => {
    fc.assert(
      fc.property(fc.integer({ min: 320, max: 560 }), (eighths) => {
        const inches = eighths / 8;
        const cm = 'Size\tHip\n10\t91.44 cm\n12\t96.52 cm\n14\t101.6 cm\n16\t106.68 cm';
        const inch = 'Size\tHip\n10\t36 in\n12\t38 in\n14\t40 in\n16\t42 in';
        const chosen = (text: string, unit: 'cm' | 'in') => sizeByLevel(parseChart(text, unit).chart, { hip: inches * 25.4 })[0]?.chosen; // prettier-ignore
        // The very middle between two sizes may fall to either side of a rounded centimetre.
        if (Math.abs((inches % 2) - 1) > 1e-9) expect(chosen(cm, 'cm')).toEqual(chosen(inch, 'in'));
      }),
    );
  });

  it('a blend grows with the body, is nothing at the size that is cut, and its edges add up', () => {
    const waistBlend = (waist: number) => {
      const [first] = chooseSize(bodyChart, finishedChart, { hip: 1000, waist }).proposals;
      const blend = first?.blends.find(({ measure }) => measure === 'waist');
      expect((blend?.perEdgeMm ?? 0) * 4).toBeCloseTo(blend?.roundMm ?? 0, 9);
      return blend?.roundMm ?? 0;
    };
    expect(waistBlend(860)).toBe(0);
    fc.assert(
      fc.property(fc.double({ min: 700, max: 1200, noNaN: true }), fc.double({ min: 0, max: 100, noNaN: true }), (mm, more) => {
        expect(waistBlend(mm + more)).toBeGreaterThanOrEqual(waistBlend(mm) - 1e-9);
      }),
    ); // prettier-ignore
  });
});

describe('a proposal', () => {
  it('goes by the hip, with the largest level and the waist beside it, each with its reason', () => {
    const { proposals } = chooseSize(bodyChart, finishedChart, { hip: 1000, waist: 1000, thigh: 570 });
    expect(proposals.map(({ id, base }) => [id, base.size])).toEqual([['by-hip', '100'], ['by-largest', '116']]); // prettier-ignore
    expect(proposals[0]?.reason).toContain('100');
    expect(proposals[0]?.blends.find(({ measure }) => measure === 'waist')).toMatchObject({ to: { size: '116' }, edges: 4, roundMm: 144, perEdgeMm: 36 }); // prettier-ignore
  });

  it('does not offer one size twice, and nothing where nothing can be compared', () => {
    expect(chooseSize(bodyChart, finishedChart, { hip: 1000, waist: 860, thigh: 607 }).proposals).toHaveLength(1); // prettier-ignore
    expect(chooseSize(empty, empty, { hip: 1000 }).proposals).toEqual([]);
  });
});
