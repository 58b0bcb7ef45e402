import { sourceWords } from '@/content/source-words';
import { Disclosure } from '@/components/ui/Disclosure';
import type { Correction } from '@/diagnosis/garments/schema';

const list = (title: string, items: readonly string[]) =>
  items.length === 0 ? null : (
    <div>
      <dt className="font-bold">{title}</dt>
      <dd>
        <ul className="list-disc pl-5">
          {items.map((item) => (
            <li key={item}>{item}</li>
          ))}
        </ul>
      </dd>
    </div>
  );

/** What stays, what is trued and walked afterwards, and where people go wrong. */
export function HowTo({ correction }: { correction: Correction }) {
  return (
    <Disclosure summary="On the paper">
      <dl className="grid gap-3 text-sm">
        <div>
          <dt className="font-bold">What it does</dt>
          <dd>{correction.description}</dd>
        </div>
        {list('Must not change', correction.keep)}
        {list('True afterwards', correction.true)}
        {list('Walk against each other', correction.walk)}
        {list('Where it goes wrong', correction.mistakes)}
        {list('Take care', correction.cautions)}
        {correction.amounts ? list('Amounts after', sourceWords(correction.amounts.sources)) : null}
      </dl>
    </Disclosure>
  );
}
