import { amountWithBasis } from '@/components/tape/basis-words';
import { sideWords } from '@/components/reading/words';
import { Section } from '@/components/ui/Section';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { BecameList } from './BecameList';
import type { Compared } from './compared';

interface Props {
  compared: Compared;
  unit: LengthUnit;
}

/** What was changed between two rounds, and what became of each sign. */
export function CompareView({ compared, unit }: Props) {
  return (
    <div className="grid gap-8 lg:grid-cols-2">
      <Section title="Changed in between">
        {compared.changes.length === 0 ? (
          <p className="text-graphite">Nothing was said to be changed.</p>
        ) : (
          <ul className="grid gap-2">
            {compared.changes.map((change) => (
              <li key={change.id} className="border-l-4 border-chalk pl-4">
                <span className="font-bold">
                  {change.name}
                  {sideWords(change.side)}
                </span>
                {change.of && change.madeMm !== null ? (
                  <span className="block">{amountWithBasis(change.madeMm, change.of, unit)}</span>
                ) : null}
              </li>
            ))}
          </ul>
        )}
      </Section>
      <Section title="What became of it">
        <BecameList signs={compared.signs} />
      </Section>
    </div>
  );
}
