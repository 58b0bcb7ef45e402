const STOP = new Set(
  'a an the of in on at to my me i it is are be was and or with when from for into that this these those there too very so just some get gets have has like where while all as by out up down over under you your'.split(
    ' ',
  ),
);
/** Small words that tell places apart are kept. */
const KEPT = new Set(['under', 'over', 'up', 'down', 'out', 'in', 'when']);

const SAME: Record<string, string> = {
  bum: 'seat', butt: 'seat', bottom: 'seat', backside: 'seat', rear: 'seat', behind: 'back', arse: 'seat', booty: 'seat',
  belly: 'abdomen', tummy: 'abdomen', stomach: 'abdomen', gut: 'abdomen', paunch: 'abdomen',
  crotch: 'fork', groin: 'fork', pants: 'trouser', trousers: 'trouser', slacks: 'trouser', jeans: 'trouser',
  wrinkle: 'line', crease: 'line', ripple: 'line', whisker: 'line', drag: 'line', pucker: 'line',
  baggy: 'slack', loose: 'slack', saggy: 'slack', droopy: 'slack', floppy: 'slack', excess: 'slack', extra: 'slack', spare: 'slack', roomy: 'slack',
  strain: 'tight', pull: 'tight', taut: 'tight', stretched: 'tight', snug: 'tight', squeeze: 'tight', constrict: 'tight',
  gap: 'gape', stick: 'gape', stand: 'gape', flare: 'gape', waistband: 'band', belt: 'band', cuff: 'hem', ankle: 'hem',
  horizontal: 'level', across: 'level', vertical: 'upright', diagonal: 'slant', slanting: 'slant', thighs: 'thigh', leg: 'leg', legs: 'leg',
  sit: 'sit', sitting: 'sit', seated: 'sit', drop: 'fall', slide: 'fall', slip: 'fall', ride: 'climb', creep: 'climb', crawl: 'climb', climb: 'climb',
  fabric: 'cloth', material: 'cloth', inner: 'inside', internal: 'inside',
}; // prettier-ignore

/** A word without its usual endings; enough for search, no grammar. */
function stem(word: string): string {
  if (word.length <= 3) return word;
  return word
    .replace(/(?:ies)$/, 'y')
    .replace(/(?:ss)$/, 'ss')
    .replace(/([^s])s$/, '$1')
    .replace(/(?:ing|ed|er|ly)$/, (ending) => (word.length - ending.length >= 3 ? '' : ending))
    .replace(/(.)\1$/, '$1');
}

const canonical = (word: string): string => {
  const root = stem(word);
  return SAME[word] ?? SAME[root] ?? SAME[`${root}e`] ?? root;
};

/** A phrase as the words that carry it: lower case, no stop words, everyday words brought to the trade's. */
export function fold(phrase: string): string[] {
  return phrase
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, ' ')
    .split(' ')
    .filter((word) => word.length > 1 && (!STOP.has(word) || KEPT.has(word)))
    .map(canonical);
}

/** Edits between two words (insert, delete, replace, swap of neighbours), given up beyond `most`. Damerau (1964), optimal string alignment. */
export function editDistance(a: string, b: string, most: number): number {
  if (Math.abs(a.length - b.length) > most) return most + 1;
  let before: number[] = [];
  let row = Array.from({ length: b.length + 1 }, (_, j) => j);
  for (let i = 1; i <= a.length; i += 1) {
    const next = [i];
    for (let j = 1; j <= b.length; j += 1) {
      const change = a[i - 1] === b[j - 1] ? 0 : 1;
      let cost = Math.min(row[j]! + 1, next[j - 1]! + 1, row[j - 1]! + change);
      if (i > 1 && j > 1 && a[i - 1] === b[j - 2] && a[i - 2] === b[j - 1])
        cost = Math.min(cost, before[j - 2]! + 1);
      next.push(cost);
    }
    before = row;
    row = next;
  }
  return row[b.length]!;
}
