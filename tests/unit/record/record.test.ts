import { describe, expect, it } from 'vitest';
import { finalPieces } from '@/components/record/final-pieces';
import { recordCsv } from '@/components/record/record-csv';
import { isPastTotal, recordRows, rowsByPiece } from '@/components/record/record-rows';
import { fileName } from '@/components/record/save-file';
import type { DeskDto } from '@/db/queries/desk';
import type { ChangeFact } from '@/db/queries/round-facts';
import { svgDocument } from '@/diagnosis/pattern/svg';

const change = (id: string, correction: string, facts: Partial<ChangeFact> = {}): ChangeFact => ({
  id,
  correction,
  side: 'both',
  basis: 'piece',
  plannedMm: 10,
  plannedTyped: '10 mm',
  madeMm: null,
  madeTyped: null,
  madeAt: null,
  reason: '',
  version: 1,
  ...facts,
});
const made = (mm: number, facts: Partial<ChangeFact> = {}) => ({
  madeMm: mm,
  madeAt: '2026-05-02T10:00:00.000Z',
  ...facts,
});

/** As much of a desk as the record reads. */
const deskOf = (...rounds: ChangeFact[][]): DeskDto => ({
  journalId: 'j',
  journalName: 'Grey trousers',
  isOwner: true,
  isSettled: false,
  wearerName: 'Wren',
  fittedFor: 'both',
  shape: [],
  body: { hip: 1000, waist: 780 },
  patternName: 'Straight leg',
  garment: 'trousers',
  rounds: rounds.map((changes, index) => ({
    id: `r${index + 1}`,
    number: index + 1,
    begun: 'first',
    wornOn: `2026-05-0${index + 1}`,
    note: '',
    hangsCleanAt: null,
    version: 1,
    cut: 'full',
    cloth: '',
    clothKind: 'woven',
    stretchPercent: 0,
    isOnGrain: true,
    size: '12',
    signs: [],
    checks: [],
    causes: [],
    measured: [],
    changes,
  })) as unknown as DeskDto['rounds'],
});

describe('the record of a pattern', () => {
  it('sums what was made, leg by leg, against the stop of this body; what is only planned does not count', () => {
    const rows = recordRows(
      deskOf(
        [change('1', 'lengthen-leg', made(30))],
        [change('2', 'lengthen-leg', made(20, { side: 'left' }))],
        [change('3', 'lengthen-leg', made(80, { side: 'left' })), change('4', 'lengthen-leg')],
      ),
    );
    expect(rows.map(({ sumMm }) => sumMm)).toEqual([30, 50, 130, 130]);
    expect(rows.map(({ capTotalMm }) => capTotalMm)).toEqual([125, 125, 125, 125]);
    expect(rows.map(isPastTotal)).toEqual([false, false, true, false]);
    expect(rows.map(({ isMade }) => isMade)).toEqual([true, true, true, false]);
  });

  it('has the amount as it was cut, not as it was planned', () => {
    const [row] = recordRows(deskOf([change('1', 'lengthen-depth', made(9))]));
    expect(row).toMatchObject({ plannedMm: 10, madeMm: 9, sumMm: 9, date: '2026-05-02', round: 1 });
  });

  it('lists a change under each piece that it cuts', () => {
    const rows = recordRows(
      deskOf([change('1', 'lengthen-depth', made(10)), change('2', 'extend-back-point')]),
    );
    expect(rowsByPiece(rows).map(({ piece, rows: own }) => [piece, own.map(({ id }) => id)])).toEqual([
      ['front', ['1']],
      ['back', ['1', '2']],
    ]);
  });

  it('keeps a change that the knowledge no longer has', () => {
    expect(recordRows(deskOf([change('1', 'once-upon-a-time', made(5))]))[0]).toMatchObject({
      name: 'once-upon-a-time',
      capTotalMm: null,
    });
  });
});

describe('as CSV', () => {
  const rows = recordRows(
    deskOf([change('1', 'lengthen-depth', made(12.7, { reason: '=HYPERLINK("x"), "twice"\nover' }))]),
  );
  it('is one quoted line a change, with the sum and the stop in millimetres', () => {
    const [head, line, ...rest] = recordCsv(rows, 'you', 'in').split('\r\n');
    expect(head).toContain('"amount mm"');
    expect(line).toContain('"1/2 in on the piece","12.70","12.70","38.00"');
    expect(rest).toEqual(['']);
  });
  it('never gives a spreadsheet a formula, and doubles quotes', () => {
    expect(recordCsv(rows, 'you', 'cm')).toContain(`"'=HYPERLINK(""x""), ""twice""\nover"`);
  });
  it('gets a file name of letters and figures only', () => {
    expect(fileName('Änne’s  trousers/../2', 'csv')).toBe(
      'änne-s-trousers-2.csv'.normalize('NFKD').replace('\u0308', '-'),
    );
  });
});

describe('the pieces now', () => {
  const drawn = (desk: DeskDto) => finalPieces(recordRows(desk), { hipMm: 1000, waistMm: 780 }, undefined);

  it('are those that were changed, planned ones not among them', () => {
    const final = drawn(
      deskOf([change('1', 'extend-back-point', made(6)), change('2', 'deepen-front-curve')]),
    );
    expect(final.ok && final.pieces.map(({ leg, piece }) => `${leg} ${piece}`)).toEqual(['both back']);
  });
  it('bring the band along when the waist has changed, and the fly when its front has', () => {
    const piecesOf = (id: string) => {
      const final = drawn(deskOf([change('1', id, made(12))]));
      return final.ok && final.pieces.map(({ piece }) => piece);
    };
    expect(piecesOf('let-out-waist-front')).toEqual(['front', 'waistband']);
    expect(piecesOf('raise-centre-front')).toEqual(['front', 'fly']);
  });
  it('part into legs once a change was made on one of them', () => {
    const final = drawn(
      deskOf([
        change('1', 'lengthen-depth', made(10)),
        change('2', 'swing-leg-in', made(6, { side: 'left' })),
      ]),
    );
    if (!final.ok) throw new Error(final.name);
    expect(final.pieces.map(({ leg, piece }) => `${leg} ${piece}`)).toEqual([
      'left front',
      'left back',
      'right front',
      'right back',
    ]);
    const [left, , right] = final.pieces;
    expect(left!.drawing.after).not.toBe(right!.drawing.after);
  });
  it('name the change that the block cannot take', () => {
    expect(drawn(deskOf([change('1', 'shorten-back-dart', made(400))]))).toEqual({
      ok: false,
      name: 'Shorten the back dart',
    });
  });
  it('are saved at full size, one unit a millimetre, and a name cannot break out of the title', () => {
    const final = drawn(deskOf([change('1', 'extend-back-point', made(6))]));
    if (!final.ok) throw new Error(final.name);
    const { drawing } = final.pieces[0]!;
    const text = svgDocument(drawing, '</title><script>alert(1)</script>');
    expect(text).not.toContain('<script>');
    const [, width = ''] = /width="([\d.]+)mm"/.exec(text) ?? [];
    const [, box = ''] = /viewBox="([^"]+)"/.exec(text) ?? [];
    expect(Number(width)).toBeCloseTo(Number(box.split(' ')[2]), 0);
  });
});
