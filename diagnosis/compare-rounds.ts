import type { View } from './garments/schema';

export type Became = 'gone' | 'eased' | 'same' | 'worse' | 'new' | 'not looked at' | 'not photographed';

export interface SignState {
  sign: string;
  side: 'left' | 'right' | 'both';
  severity: number;
}

export interface ComparedSign {
  sign: string;
  side: 'left' | 'right' | 'both';
  before: number | null;
  after: number | null;
  became: Became;
}

const ORDER: Became[] = ['new', 'worse', 'same', 'eased', 'gone', 'not photographed', 'not looked at'];

function becameOf(before: number | null, after: number | null, isPhotographed: boolean): Became | null {
  if (after === null) {
    if (!before) return null;
    return isPhotographed ? 'not looked at' : 'not photographed';
  }
  if (!before) return after > 0 ? 'new' : null;
  if (after === 0) return 'gone';
  if (after === before) return 'same';
  return after < before ? 'eased' : 'worse';
}

/**
 * What became of each sign between two rounds. A sign that was not looked for again has not gone: it says so.
 * @param after with the views that were photographed in it
 * @param viewsOf the views that can show a sign; one without a photo in the later round could not be judged
 */
export function compareRounds(
  before: { signs: SignState[] },
  after: { signs: SignState[]; views: readonly View[] },
  viewsOf: (sign: string) => readonly View[],
): ComparedSign[] {
  const keyOf = ({ sign, side }: SignState) => `${sign} ${side}`;
  const earlier = new Map(before.signs.map((state) => [keyOf(state), state]));
  const later = new Map(after.signs.map((state) => [keyOf(state), state]));
  const all = new Map([...earlier, ...later]);
  return [...all]
    .flatMap(([key, { sign, side }]): ComparedSign[] => {
      const was = earlier.get(key)?.severity ?? null;
      const is = later.get(key)?.severity ?? null;
      const became = becameOf(
        was,
        is,
        viewsOf(sign).some((view) => after.views.includes(view)),
      );
      return became ? [{ sign, side, before: was, after: is, became }] : [];
    })
    .sort((a, b) => ORDER.indexOf(a.became) - ORDER.indexOf(b.became) || a.sign.localeCompare(b.sign));
}
