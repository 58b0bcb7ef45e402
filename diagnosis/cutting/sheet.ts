/** What a first muslin is to tell, and from what. */
export interface SheetFacts {
  cloth: 'woven' | 'stretch-woven' | 'knit';
  cut: 'full' | 'shorts';
  /** A narrow leg holds the crotch from below: it cannot be read as shorts. */
  isNarrowLeg: boolean;
}

export const SHEET_PARTS = ['cloth', 'cut', 'mark', 'sew', 'wear'] as const;
export type SheetPart = (typeof SHEET_PARTS)[number];

export const PART_WORDS: Record<SheetPart, string> = {
  cloth: 'The cloth',
  cut: 'Cutting',
  mark: 'Marking',
  sew: 'Basting',
  wear: 'Before the good cloth',
};

export interface SheetLine {
  /** Kept with its tick; never reused. */
  id: string;
  part: SheetPart;
  text: string;
  why: string | null;
  sources: readonly string[];
}

type Conditional = SheetLine & { when?: (facts: SheetFacts) => boolean };

const CP = ['common practice'] as const;
const isStretch = ({ cloth }: SheetFacts) => cloth !== 'woven';

const LINES: readonly Conditional[] = [
  { id: 'like-weight', part: 'cloth', text: 'Cheap cloth of like weight and firmness to the good cloth.', why: 'Lighter cloth folds where the good cloth will not.', sources: ['trousers:TC032', 'trousers:TC044'] },
  { id: 'like-stretch', part: 'cloth', text: 'Its stretch on the gauge within 5 points of the good cloth, across and along.', why: 'A stiffer muslin reads as too small, a looser one hides it.', sources: ['trousers:TC032', 'trousers:TC044'], when: isStretch },
  { id: 'pressed-flat', part: 'cloth', text: 'Press it flat and pull it straight: threads across at right angles to the selvedge.', why: 'Cloth off grain twists a leg, and paper gets the blame.', sources: CP },
  { id: 'stretch-across', part: 'cut', text: 'Lay the greater stretch round the body.', why: 'The other way round it cannot give where it must.', sources: ['trousers:TC087'], when: isStretch },
  { id: 'edge-allowance', part: 'cut', text: '25 mm (1 in) at side seams, inseams, waist, and centre back above the notch.', why: 'What is too tight can then be let out without cutting again.', sources: CP },
  { id: 'curve-allowance', part: 'cut', text: '10 mm (3/8 in) in the crotch curve below the notches.', why: 'A wide allowance in the curve holds like a short fork.', sources: CP },
  { id: 'leave-out', part: 'cut', text: 'Leave out pocket bags, belt loops, facings, hems and the fly shield.', why: 'They tell nothing of the fit. Slant pocket openings are basted shut on their stay.', sources: CP },
  { id: 'as-shorts', part: 'cut', text: 'It may end above the knee.', why: 'Depth, rises, hip and fork can be read; thigh below the fork, knee, calf, swing and hem cannot.', sources: ['trousers:TC040', 'trousers:TC042'], when: ({ cut, isNarrowLeg, cloth }) => cut === 'shorts' && !isNarrowLeg && cloth === 'woven' },
  { id: 'not-as-shorts', part: 'cut', text: 'Cut the legs full length.', why: 'A narrow or stretch leg holds the fork from below: as shorts it would hang better than it is.', sources: ['trousers:TC040', 'trousers:TC042'], when: (facts) => facts.isNarrowLeg || isStretch(facts) },
  { id: 'full-legs', part: 'cut', text: 'Cut the legs full length.', why: 'Then swing, knee and hem can be read too.', sources: CP, when: ({ isNarrowLeg, cloth, cut }) => cut === 'full' && !isNarrowLeg && cloth === 'woven' },
  { id: 'level-lines', part: 'mark', text: 'Hip line, crotch line and knee line right across each piece, in thread or pen.', why: 'A line that tilts shows where length is short.', sources: CP },
  { id: 'plumb-lines', part: 'mark', text: 'The grain line of each leg from top to hem, front and back.', why: 'It must hang plumb; if it leans, the leg is to be swung.', sources: CP },
  { id: 'seam-lines', part: 'mark', text: 'Waist seam, centre front and centre back seamlines, the notches and the dart points.', why: 'The waist seam is measured against the body first of all.', sources: CP },
  { id: 'names', part: 'mark', text: 'Left and right, front and back on every piece; date and size on one.', why: 'A photo in a mirror looks like the other leg.', sources: CP },
  { id: 'long-stitch', part: 'sew', text: 'The longest machine stitch, 4 to 5 mm, one colour for what may be unpicked.', why: 'It comes out in one pull, and a pulled stitch shows where cloth is tight.', sources: CP },
  { id: 'curve-twice', part: 'sew', text: 'The crotch curve last, stitched twice below the notches, not pressed open.', why: 'The inseam allowances stand away from it; trimmed to 10 mm it lies as the real seam will.', sources: CP },
  { id: 'waist-elastic', part: 'sew', text: 'A firm elastic, 10 to 15 mm wide, on the waist seam instead of a band.', why: 'It finds the waist by itself and holds without a band’s stiffness.', sources: CP },
  { id: 'back-inseam', part: 'sew', text: 'Stretch the back inseam to the front from fork to knee where the draft made it shorter.', why: 'That difference is drafted; evened out, folds stand below the seat.', sources: ['W2', 'W3'] },
  { id: 'full-length-once', part: 'wear', text: 'Wear one full length in like cloth before the good cloth is cut.', why: 'What shorts cannot show shows there.', sources: CP },
  { id: 'half-hour', part: 'wear', text: 'Wear it for half an hour, then photograph again.', why: 'Cloth that grows shows at seat and knee only then.', sources: ['standards:F09'], when: isStretch },
  { id: 'good-cloth-washed', part: 'wear', text: 'Wash and dry the good cloth as it will be washed, before it is cut.', why: 'Cotton gives 2 to 5 per cent in its first washes, raw denim up to 10.', sources: ['standards:F10'] },
]; // prettier-ignore

/** The cutting and marking sheet of a first muslin: only the lines that are true for it, in the order of work. */
export function cuttingSheet(facts: SheetFacts): SheetLine[] {
  return LINES.filter(({ when }) => when?.(facts) ?? true).map(({ id, part, text, why, sources }) => ({
    id,
    part,
    text,
    why,
    sources,
  }));
}

export const SHEET_LINE_IDS: readonly string[] = LINES.map(({ id }) => id);
