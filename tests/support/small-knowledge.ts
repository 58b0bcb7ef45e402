import type { Check, Correction, Dimension, Grade, Knowledge, Link, Sign } from '@/diagnosis/garments/schema';

/** A small invented garment, so that the engine is tested without knowing trousers. */

const SOURCES = ['common practice' as const];

export function dimension(id: string, over: Partial<Dimension> = {}): Dimension {
  return {
    id,
    name: id,
    description: id,
    more: { says: 'more', paper: 'add' },
    less: { says: 'less', paper: 'take' },
    scaleMm: 12,
    toleranceMm: 5,
    sided: false,
    basis: 'piece',
    conversions: { pinch: 2 },
    sizeLevel: 'length',
    loss: { more: 1.5, less: 1 },
    stage: 2,
    needsFullLength: false,
    sources: SOURCES,
    ...over,
  };
}

export function link(
  to: string,
  direction?: Link['direction'],
  grade: Grade = 'usual',
  over: Partial<Link> = {},
): Link {
  return { to, direction, grade, sources: SOURCES, ...over };
}

export function sign(id: string, links: Link[], over: Partial<Sign> = {}): Sign {
  return {
    id,
    name: id,
    description: id,
    group: 'lines',
    tension: 'tight',
    zone: 'seat',
    views: ['back'],
    sided: false,
    leak: 'usual',
    links,
    maskedBy: [],
    lookAlikes: [],
    synonyms: [],
    template: null,
    needsFullLength: false,
    sources: SOURCES,
    ...over,
  };
}

export function check(id: string, outcomes: Check['outcomes'], over: Partial<Check> = {}): Check {
  return {
    id,
    name: id,
    question: `${id}?`,
    how: id,
    effort: 'lift',
    secondPerson: false,
    outcomes,
    amount: 'none',
    amountTo: null,
    sided: false,
    cautions: [],
    sources: SOURCES,
    ...over,
  };
}

export function correction(
  id: string,
  vector: Correction['vector'],
  over: Partial<Correction> = {},
): Correction {
  return {
    id,
    name: id,
    description: id,
    group: 'changes',
    amounts: {
      basis: 'piece',
      conversions: { pinch: 2 },
      stepMm: 3,
      firstMm: 10,
      capRoundMm: 19,
      capTotalMm: 38,
      sizeLevel: 'length',
      sources: SOURCES,
    },
    vector,
    sided: false,
    stage: 2,
    seam: 'length',
    neverWith: [],
    pieces: ['back'],
    operators: ['wedge'],
    keep: ['side length'],
    true: [],
    walk: [],
    mistakes: ['one', 'two'],
    cautions: [],
    risk: 0.1,
    muslin: 're-baste',
    sources: SOURCES,
    ...over,
  };
}

const dims = [
  dimension('depth'),
  dimension('rise', { scaleMm: 10 }),
  dimension('point', { scaleMm: 8, toleranceMm: 3 }),
  dimension('seat', {
    basis: 'round',
    conversions: { edge: 1, pinch: 2 },
    scaleMm: 16,
    toleranceMm: 8,
    sizeLevel: 'hip',
    stage: 1,
  }),
  dimension('leg', { sided: true, scaleMm: 10, toleranceMm: 4, sizeLevel: 'thigh', needsFullLength: true }),
  dimension('knee', { sided: true, scaleMm: 12, toleranceMm: 6, sizeLevel: 'knee' }),
];

function pairOf(of: Dimension): Correction[] {
  const entry = (perMm: number) => [{ dimension: of.id, perMm, coupling: false }];
  const over = {
    sided: of.sided,
    stage: of.stage,
    seam: of.stage === 1 ? ('girth' as const) : ('length' as const),
  };
  return [correction(`add-${of.id}`, entry(1), over), correction(`take-${of.id}`, entry(-1), over)];
}

export const small: Knowledge = {
  garment: 'smock',
  name: 'Smock',
  dimensions: dims,
  causes: [
    { id: 'stance', name: 'Stance', description: 'd', prior: 0.08, action: 'Stand again.', sources: SOURCES },
    {
      id: 'untrimmed',
      name: 'Untrimmed curve',
      description: 'd',
      prior: 0.25,
      action: 'Trim.',
      sources: SOURCES,
    },
  ],
  signs: [
    sign('taut-rise', [
      link('depth', 'more'),
      link('rise', 'more', 'strong'),
      link('untrimmed', undefined, 'usual'),
    ]),
    sign('fold-band', [link('rise', 'less', 'strong'), link('seat', 'more', 'sometimes')], {
      maskedBy: [{ to: 'seat', direction: 'more' }],
    }),
    sign('seat-lines', [link('seat', 'more', 'defining'), link('point', 'more', 'usual')]),
    sign('fork-lines', [
      link('point', 'more', 'strong'),
      link('depth', 'more', 'sometimes'),
      link('untrimmed'),
    ]),
    sign('seat-folds', [link('depth', 'less', 'usual'), link('seat', 'less', 'usual'), link('stance')], {
      maskedBy: [{ to: 'seat', direction: 'more' }],
    }),
    sign('leg-twist', [link('leg', 'more', 'strong'), link('stance', undefined, 'sometimes')], {
      sided: true,
      needsFullLength: true,
    }),
    sign(
      'leg-fold',
      [link('leg', 'less', 'strong'), link('knee', 'more', 'usual'), link('depth', 'less', 'rare')],
      { sided: true },
    ),
    sign('knee-pull', [link('knee', 'more', 'defining')], { sided: true, leak: 'low' }),
    sign('only-depth', [link('depth', 'more', 'usual'), link('depth', 'less', 'rare')], { leak: 'high' }),
    sign('hem-kick', [link('leg', 'more'), link('knee', 'less'), link('point', 'less', 'rare')]),
  ],
  checks: [
    check('lift-band', [
      { id: 'eases', name: 'Eases', links: [link('depth', 'more', 'strong'), link('rise', 'more', 'usual')] },
      { id: 'stays', name: 'Stays', links: [] },
    ]),
    check(
      'pinch-seat',
      [
        { id: 'clears', name: 'Clears', links: [link('seat', 'less', 'strong')] },
        { id: 'stays', name: 'Stays', links: [] },
      ],
      { amount: 'pinch', amountTo: { dimension: 'seat', direction: 'less' }, effort: 'pinned' },
    ),
    check(
      'open-knee',
      [
        { id: 'opens', name: 'Opens', links: [link('knee', 'more', 'defining')] },
        { id: 'stays', name: 'Stays', links: [link('leg', 'less', 'usual')] },
      ],
      { amount: 'gap', amountTo: { dimension: 'knee', direction: 'more' }, effort: 'release', sided: true },
    ),
    check(
      'stand-again',
      [
        { id: 'gone', name: 'Gone', links: [link('stance', undefined, 'strong')] },
        { id: 'same', name: 'The same', links: [] },
      ],
      { effort: 'look' },
    ),
  ],
  corrections: dims.flatMap(pairOf),
  shape: [
    {
      id: 'round-seat',
      name: 'Round seat',
      description: 'd',
      synonyms: [],
      leans: [
        { to: 'rise', direction: 'more', logOdds: 0.7 },
        { to: 'point', direction: 'more', logOdds: 0.4 },
      ],
      sources: SOURCES,
    },
    {
      id: 'left-leg-full',
      name: 'Left leg full',
      description: 'd',
      synonyms: [],
      leans: [{ to: 'leg', direction: 'more', logOdds: 0.5, side: 'left' }],
      sources: SOURCES,
    },
  ],
  sums: [],
};
