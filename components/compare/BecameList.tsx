import { sideWords } from '@/components/reading/words';
import type { Compared } from './compared';

const HEADS = {
  new: 'Came',
  worse: 'Grew stronger',
  same: 'Stayed',
  eased: 'Eased',
  gone: 'Went',
  'not photographed': 'Not photographed again',
  'not looked at': 'Not looked at again',
} as const;

const STRENGTH = ['none', 'faint', 'clear', 'pulling'] as const;

const fromTo = (before: number | null, after: number | null) =>
  after === null || before === after
    ? (STRENGTH[before ?? 0] ?? '')
    : `${STRENGTH[before ?? 0]} to ${STRENGTH[after]}`;

/** What came, grew, stayed, eased and went, in that order: what still asks for something stands first. */
export function BecameList({ signs }: { signs: Compared['signs'] }) {
  if (signs.length === 0) return <p className="text-graphite">No sign was said in either round.</p>;
  const groups = [...new Set(signs.map(({ became }) => became))];
  return (
    <dl className="grid gap-4">
      {groups.map((became) => {
        const list = signs.filter((one) => one.became === became);
        return (
          <div key={became}>
            <dt className="font-bold">
              {HEADS[became]} <span className="font-normal text-graphite">({list.length})</span>
            </dt>
            {list.map((one) => (
              <dd
                key={`${one.sign} ${one.side}`}
                className="flex flex-wrap justify-between gap-x-4 border-b border-seam py-1"
              >
                <span>
                  {one.name}
                  {sideWords(one.side)}
                </span>
                <span className="text-sm text-graphite">{fromTo(one.before, one.after)}</span>
              </dd>
            ))}
          </div>
        );
      })}
    </dl>
  );
}
