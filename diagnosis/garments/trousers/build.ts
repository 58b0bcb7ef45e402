import type {
  Basis,
  Check,
  Correction,
  Cause,
  Dimension,
  Direction,
  Grade,
  Link,
  ShapeNote,
  Sign,
} from '../schema';

/** Short forms for writing the knowledge down; each fills in what is the same nearly everywhere. */

const CP = 'common practice' as const;
export type Source = Link['sources'][number];
const sourcesOf = (sources: Source[]): Source[] => (sources.length === 0 ? [CP] : sources);

export const link = (to: string, direction: Direction, grade: Grade, ...sources: Source[]): Link => ({
  to,
  direction,
  grade,
  sources: sourcesOf(sources),
});
/** A link to a cause: present or not, it has no direction. */
export const causeLink = (to: string, grade: Grade, ...sources: Source[]): Link => ({
  to,
  grade,
  sources: sourcesOf(sources),
});

type Level = Dimension['sizeLevel'];
const GIRTH = { round: 1, piece: 1, edge: 1, pinch: 2 };
const LENGTH = { piece: 1, edge: 1, pinch: 2 };

/** Tight is 1.5 times as dear as slack: cloth can be taken in, not let out (common practice). */
const lossOf = (weight: number, slack = weight) => ({ more: weight * 1.5, less: slack });

interface DimensionWords {
  id: string;
  name: string;
  more: [says: string, paper: string];
  less: [says: string, paper: string];
  scaleMm: number;
  toleranceMm: number;
  level: Level;
  stage: number;
  weight: number;
  slackWeight?: number;
  sided?: boolean;
  fullLength?: boolean;
  sources?: Source[];
}

export function dimension(words: DimensionWords): Dimension {
  const { id, name, more, less, scaleMm, toleranceMm, level, stage, weight, slackWeight, sources } = words;
  return {
    id,
    name,
    description: `${more[0]}; or: ${less[0]}.`,
    more: { says: more[0], paper: more[1] },
    less: { says: less[0], paper: less[1] },
    scaleMm,
    toleranceMm,
    sided: words.sided ?? false,
    basis: level === 'length' ? 'piece' : 'round',
    conversions: level === 'length' ? LENGTH : GIRTH,
    sizeLevel: level,
    loss: lossOf(weight, slackWeight),
    stage,
    needsFullLength: words.fullLength ?? false,
    sources: sources ?? [CP],
  };
}

export const cause = (
  id: string,
  name: string,
  description: string,
  prior: number,
  action: string,
  ...sources: Source[]
): Cause => ({
  id,
  name,
  description,
  prior,
  action,
  sources: sourcesOf(sources),
});

interface SignWords {
  id: string;
  name: string;
  description: string;
  group: string;
  tension: Sign['tension'];
  zone: Sign['zone'];
  views: Sign['views'];
  links: Link[];
  sided?: boolean;
  leak?: Sign['leak'];
  maskedBy?: Sign['maskedBy'];
  lookAlikes?: [sign: string, differs: string][];
  synonyms: string[];
  /** Null where the sign is felt and no line can show it. */
  template: Sign['template'];
  fullLength?: boolean;
  aliases?: string[];
}

export function sign(words: SignWords): Sign {
  const {
    sided = false,
    leak = 'usual',
    maskedBy = [],
    lookAlikes = [],
    fullLength = false,
    links,
    ...rest
  } = words;
  return {
    ...rest,
    links,
    sided,
    leak,
    maskedBy,
    lookAlikes: lookAlikes.map(([other, differs]) => ({ sign: other, differs })),
    needsFullLength: fullLength,
    sources: [...new Set(links.flatMap(({ sources }) => sources))],
  };
}

interface CheckWords {
  id: string;
  name: string;
  question: string;
  how: string;
  effort: Check['effort'];
  outcomes: [id: string, name: string, ...links: Link[]][];
  secondPerson?: boolean;
  amount?: Check['amount'];
  amountTo?: [dimension: string, direction: Direction];
  sided?: boolean;
  cautions?: string[];
  sources?: Source[];
}

const OFF_THE_BODY =
  'Take it off. Unpick, tack a strip of cloth across so that nothing gapes, put it on again, then measure.';
const SAFE_PINS = 'Safety pins or tacking before you sit, bend or walk; none between the legs.';

export function check(words: CheckWords): Check {
  const { outcomes, amountTo, effort, cautions = [], ...rest } = words;
  const usual = effort === 'release' ? [OFF_THE_BODY] : effort === 'pinned' ? [SAFE_PINS] : [];
  return {
    ...rest,
    effort,
    secondPerson: words.secondPerson ?? false,
    amount: words.amount ?? 'none',
    amountTo: amountTo ? { dimension: amountTo[0], direction: amountTo[1] } : null,
    sided: words.sided ?? false,
    outcomes: outcomes.map(([id, name, ...links]) => ({ id, name, links })),
    cautions: [...usual, ...cautions],
    sources: words.sources ?? [CP],
  };
}

/** [step, first, stop of a round, stop in total], mm. */
type Amounts = [number, number, number, number];
const EDGES = (count: number) => ({ edge: 1, round: 1 / count, pinch: 2 / count });

interface CorrectionWords {
  id: string;
  name: string;
  description: string;
  group: string;
  amounts: Amounts | null;
  basis?: Basis;
  /** With basis `edge`: on how many edges. */
  edges?: number;
  level?: Level;
  /** Millimetres of need met (+) or made (−) per millimetre; couplings follow a `~`. */
  vector: [dimension: string, perMm: number, coupling?: '~'][];
  stage: number;
  seam: Correction['seam'];
  neverWith?: string[];
  pieces: Correction['pieces'];
  operators: string[];
  keep: string[];
  true: string[];
  walk: string[];
  mistakes: [string, string];
  cautions?: string[];
  risk?: number;
  muslin?: Correction['muslin'];
  sided?: boolean;
  sources?: Source[];
}

const BASIS_CONVERSIONS = (basis: Basis, edges: number): Partial<Record<Basis, number>> => {
  if (basis === 'edge') return EDGES(edges);
  return basis === 'round' ? { round: 1, pinch: 2 } : { [basis]: 1 };
};

export function correction(words: CorrectionWords): Correction {
  const { amounts, basis = 'piece', edges = 4, level = 'length', vector, cautions = [], ...rest } = words;
  const { neverWith = [], risk = 0.15, muslin = 're-baste', sided = false, sources = [CP] } = words;
  const [stepMm = 0, firstMm = 0, capRoundMm = 0, capTotalMm = 0] = amounts ?? [];
  return {
    id: rest.id,
    name: rest.name,
    description: rest.description,
    group: rest.group,
    amounts: amounts && {
      basis,
      conversions: BASIS_CONVERSIONS(basis, edges),
      stepMm,
      firstMm,
      capRoundMm,
      capTotalMm,
      sizeLevel: level,
      sources,
    },
    vector: vector.map(([dimension, perMm, coupling]) => ({ dimension, perMm, coupling: coupling === '~' })),
    sided,
    stage: rest.stage,
    seam: rest.seam,
    neverWith,
    pieces: rest.pieces,
    operators: rest.operators,
    keep: rest.keep,
    true: rest.true,
    walk: rest.walk,
    mistakes: rest.mistakes,
    cautions,
    risk,
    muslin,
    sources,
  };
}

type Lean = [to: string, direction: Direction, logOdds: number];
export const shape = (
  id: string,
  name: string,
  description: string,
  synonyms: string[],
  leans: Lean[],
  ...sources: Source[]
): ShapeNote => ({
  id,
  name,
  description,
  synonyms,
  leans: leans.map(([to, direction, logOdds]) => ({ to, direction, logOdds })),
  sources: sourcesOf(sources),
});
