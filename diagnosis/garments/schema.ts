import { z } from 'zod';

/**
 * The shape of what Ruckle knows about one kind of garment. Data only: the engine reads it and knows no garment.
 * All lengths are millimetres at the reference body (hip 1000 mm). Ids are kebab-case trade words, unique across
 * every kind of thing within a garment, never reused; a renamed id keeps an alias.
 */

export const GRADES = ['defining', 'strong', 'usual', 'sometimes', 'rare'] as const;
export const BASES = ['round', 'piece', 'edge', 'pinch'] as const;
export const VIEWS = ['front', 'back', 'left', 'right', 'seated', 'close-up'] as const;
export const CLOTHS = ['woven', 'stretch-woven', 'knit'] as const;
export const SIZE_LEVELS = ['waist', 'hip', 'thigh', 'knee', 'calf', 'length'] as const;

const id = z.string().regex(/^[a-z][a-z0-9]*(-[a-z0-9]+)*$/);
/** `trousers:S02`, `standards:B24`, a `W4` page of the fitter's reference, or the words `common practice`. */
const source = z.union([
  z.string().regex(/^(trousers|standards):[A-Z]+[0-9]+$/),
  z.string().regex(/^W[0-9]+$/),
  z.literal('common practice'),
]);
const sources = z.array(source).min(1);
const direction = z.enum(['more', 'less']);
const grade = z.enum(GRADES);
const words = z.string().min(1);

/**
 * How many millimetres of the owner's own basis one millimetre in another basis stands for.
 * A hip correction stated per edge on four edges: `{ edge: 1, round: 0.25, pinch: 0.5 }`. A basis left out cannot be converted.
 */
const conversions = z.partialRecord(z.enum(BASES), z.number().positive());

export const dimensionSchema = z.strictObject({
  id,
  name: words,
  description: words,
  /** What + and − say about the body, and what they do to the paper. */
  more: z.strictObject({ says: words, paper: words }),
  less: z.strictObject({ says: words, paper: words }),
  scaleMm: z.number().positive(),
  toleranceMm: z.number().positive(),
  sided: z.boolean(),
  basis: z.enum(BASES),
  conversions,
  sizeLevel: z.enum(SIZE_LEVELS),
  /** Relative cost of one tolerance of misfit left, on either side (cloth can be taken in, not let out). */
  loss: z.strictObject({ more: z.number().positive(), less: z.number().positive() }),
  /** Place in the order of work, 1 (let out what is tight) … 8 (hem). */
  stage: z.int().min(1).max(8),
  /** Where on the garment it acts; a leg dimension says nothing on a muslin cut as shorts. */
  needsFullLength: z.boolean(),
  sources,
  aliases: z.array(id).optional(),
});

export const causeSchema = z.strictObject({
  id,
  name: words,
  description: words,
  prior: z.number().gt(0).lt(1),
  /** Where it can only be in some kinds of cloth. */
  onlyIn: z.array(z.enum(CLOTHS)).optional(),
  /** What to do, never on paper, before a new photo. */
  action: words,
  sources,
  aliases: z.array(id).optional(),
});

/** `to` is a dimension (then `direction` is given) or a cause (then it is not). */
export const linkSchema = z.strictObject({
  to: id,
  direction: direction.optional(),
  grade,
  sources,
  /** For a sided sign and a sided dimension: the link acts on the other leg. */
  opposite: z.boolean().optional(),
});

const zone = z.enum([
  'waist-front', 'waist-back', 'waist-side', 'abdomen', 'high-hip-side', 'hip-front', 'hip-back', 'hip-side', 'fork-front',
  'fork-back', 'seat', 'under-seat', 'inner-thigh', 'thigh-front', 'thigh-back', 'knee', 'behind-knee', 'calf',
  'lower-leg', 'hem', 'side-seam', 'inseam', 'pocket', 'fly', 'waistband',
]); // prettier-ignore

/**
 * What a mark must look like, in figure coordinates, to be read as this sign. Angles are degrees from plumb, taken modulo
 * 180 (a line has no direction): + leans to the wearer's side seam going down, in side and seated views to their back.
 */
export const templateSchema = z.strictObject({
  zones: z.array(zone).min(1),
  kinds: z.array(z.enum(['tight', 'slack', 'gap', 'pooling', 'tilt'])).min(1),
  angleDeg: z.strictObject({ from: z.number(), to: z.number() }).nullable(),
  /** Landmark that the line starts at or heads for (names of the figure's landmarks). */
  anchor: z.string().nullable(),
  target: z.string().nullable(),
  /** Length relative to the crotch depth of the figure. */
  lengthRatio: z.strictObject({ from: z.number(), to: z.number() }).nullable(),
});

export const signSchema = z.strictObject({
  id,
  name: words,
  description: words,
  group: id,
  tension: z.enum(['tight', 'slack', 'gap', 'tilt', 'place', 'feel']),
  zone,
  views: z.array(z.enum(VIEWS)).min(1),
  sided: z.boolean(),
  /** How readily it is noted where nothing is wrong. */
  leak: z.enum(['low', 'usual', 'high']),
  links: z.array(linkSchema).min(1),
  /** Something that, while likely, hides the sign: "looked, not there" then counts less. */
  maskedBy: z.array(z.strictObject({ to: id, direction: direction.optional() })),
  lookAlikes: z.array(z.strictObject({ sign: id, differs: words })),
  /** Everyday words, insults included: for search only, never shown back. */
  synonyms: z.array(words),
  template: templateSchema.nullable(),
  needsFullLength: z.boolean(),
  sources,
  aliases: z.array(id).optional(),
});

/**
 * A check done with eyes, fingers or pins. Outcomes are tried in order: each but the last happens with a noisy-OR over its
 * links, given that none before it did; the last is what remains, and may carry links of its own as plain support.
 */
export const checkSchema = z.strictObject({
  id,
  name: words,
  question: words,
  how: words,
  effort: z.enum(['look', 'lift', 'pinned', 'release']),
  secondPerson: z.boolean(),
  outcomes: z.array(z.strictObject({ id, name: words, links: z.array(linkSchema) })).min(2),
  /** What length the outcome may carry; `pinch` is a fold depth (cloth = 2 × depth × places), `gap` an opening. */
  amount: z.enum(['none', 'pinch', 'gap']),
  /** The need (own basis) that a stated amount speaks about, and its direction. */
  amountTo: z.strictObject({ dimension: id, direction }).nullable(),
  sided: z.boolean(),
  cautions: z.array(words),
  sources,
  aliases: z.array(id).optional(),
});

const amounts = z.strictObject({
  basis: z.enum(BASES),
  conversions,
  stepMm: z.number().positive(),
  firstMm: z.number().positive(),
  capRoundMm: z.number().positive(),
  capTotalMm: z.number().positive(),
  sizeLevel: z.enum(SIZE_LEVELS),
  sources,
});

export const correctionSchema = z.strictObject({
  id,
  name: words,
  description: words,
  group: id,
  /** Null where the change is not a length (recut on grain, a pocket stay). */
  amounts: amounts.nullable(),
  /** Millimetres of need met (+) or made (−) per millimetre of amount, in each dimension's own basis, couplings included. `cause` effects have none. */
  vector: z.array(z.strictObject({ dimension: id, perMm: z.number(), coupling: z.boolean() })),
  sided: z.boolean(),
  /** Order of work, 1–8. */
  stage: z.int().min(1).max(8),
  /** At most one change of each of these seams in a try-on. */
  seam: z.enum(['front-crotch', 'back-crotch', 'girth', 'length', 'other']),
  neverWith: z.array(id),
  pieces: z.array(z.enum(['front', 'back', 'waistband', 'yoke', 'fly', 'pocket'])).min(1),
  operators: z.array(id).min(1),
  keep: z.array(words).min(1),
  true: z.array(words),
  walk: z.array(words),
  mistakes: z.tuple([words, words]),
  cautions: z.array(words),
  /** Cost in tolerances of doing it when it was not needed (0 none … 1 cannot be undone). */
  risk: z.number().min(0).max(1),
  /** The least that the muslin needs for it. */
  muslin: z.enum(['re-baste', 'patch', 'new-cloth']),
  sources,
  aliases: z.array(id).optional(),
});

/** Log-odds toward a direction of a need, 0 … 0.7 (a factor of 2 at the most); with `side`, of that leg alone. */
const leans = z.array(
  z.strictObject({
    to: id,
    direction,
    logOdds: z.number().min(0).max(0.7),
    side: z.enum(['left', 'right']).optional(),
  }),
);

export const shapeSchema = z.strictObject({
  id,
  name: words,
  description: words,
  /** Old trade words: for search only. */
  synonyms: z.array(words),
  leans,
  /** The note applies by itself when the garment is fitted for this. */
  fittedFor: z.enum(['both', 'seated']).optional(),
  sources,
  aliases: z.array(id).optional(),
});

/** A cloth that makes some needs a little more common, and only a little. */
export const clothSchema = z.strictObject({ kind: z.enum(CLOTHS), leans, sources });

/** A body measure that speaks about a weighted sum of needs. */
export const sumSchema = z.strictObject({
  id,
  name: words,
  terms: z.array(z.strictObject({ dimension: id, weight: z.number() })).min(1),
  /** One standard deviation, mm: tape on a body, and design ease where unknown. */
  tapeSdMm: z.number().positive(),
  easeSdMm: z.number().nonnegative(),
  sources,
});

export const knowledgeSchema = z.strictObject({
  garment: id,
  name: words,
  dimensions: z.array(dimensionSchema),
  causes: z.array(causeSchema),
  signs: z.array(signSchema),
  checks: z.array(checkSchema),
  corrections: z.array(correctionSchema),
  shape: z.array(shapeSchema),
  sums: z.array(sumSchema),
  cloth: z.array(clothSchema).optional(),
});

export type Grade = (typeof GRADES)[number];
export type Basis = (typeof BASES)[number];
export type View = (typeof VIEWS)[number];
export type Direction = z.infer<typeof direction>;
export type Zone = z.infer<typeof zone>;
export type Dimension = z.infer<typeof dimensionSchema>;
export type Cause = z.infer<typeof causeSchema>;
export type Link = z.infer<typeof linkSchema>;
export type Sign = z.infer<typeof signSchema>;
export type Check = z.infer<typeof checkSchema>;
export type Correction = z.infer<typeof correctionSchema>;
export type ShapeNote = z.infer<typeof shapeSchema>;
export type MeasuredSum = z.infer<typeof sumSchema>;
export type Knowledge = z.infer<typeof knowledgeSchema>;
