import { Amount } from '@/components/ui/Amount';
import { Disclosure } from '@/components/ui/Disclosure';
import type { BeforeTheCut, CheckedDifference } from '@/diagnosis/before-the-cut/before-the-cut';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { ListTick } from './ListTick';
import { SuggestionLines } from './SuggestionLines';

interface Props {
  cut: BeforeTheCut;
  knowledge: Knowledge;
  altered: readonly string[];
  unit: LengthUnit;
}

/** Each difference between the body and the flat pattern, its error, what it speaks about, and what to do about it first. */
export function FlatCheckSection({ cut, knowledge, altered, unit }: Props) {
  const { differences, notCompared } = cut;
  if (differences.length === 0 && notCompared.length === 0)
    return (
      <p className="max-w-prose text-graphite">
        Where body and pattern have a measure in common, their difference stands here.
      </p>
    );
  return (
    <>
      <p className="max-w-prose">
        {altered.length === 0 ? 'Straight from the draft: nothing is altered first.' : 'Altered first, as ticked.'}{' '}
        Everything here goes into the reading of the first round, as long as it is ticked.
      </p>
      <ul className="grid max-w-3xl gap-3">
        {differences.map((difference) => (
          <DifferenceCard key={difference.measure} difference={difference} knowledge={knowledge} altered={altered} unit={unit} />
        ))}
      </ul>
      {notCompared.length > 0 ? (
        <ul className="grid max-w-3xl gap-1 text-graphite">
          {notCompared.map(({ measure, name, why }) => (
            <li key={measure}>
              {name}: {why}
            </li>
          ))}
        </ul>
      ) : null}
    </>
  );
} // prettier-ignore

interface CardProps {
  difference: CheckedDifference;
  knowledge: Knowledge;
  altered: readonly string[];
  unit: LengthUnit;
}

const KIND_WORDS = { short: 'the body wants more', spare: 'cloth is spare', within: 'within the error' };

function DifferenceCard({ difference, knowledge, altered, unit }: CardProps) {
  const { measure, name, needMm, sdMm, kind, terms, advice, isLeftOut } = difference;
  const needs = terms.map(
    ({ dimension }) => knowledge.dimensions.find(({ id }) => id === dimension)?.name ?? dimension,
  );
  return (
    <li className="border-l-4 border-line bg-paper px-4 py-3">
      <h3 className="font-bold">
        {name}: {needMm > 0 ? '+' : ''}
        <Amount mm={needMm} unit={unit} /> <span className="font-normal">({KIND_WORDS[kind]})</span>
      </h3>
      <p className="text-sm text-graphite">
        give or take <Amount mm={sdMm} unit={unit} rounding="up" />
      </p>
      <AdviceLines advice={advice} unit={unit} />
      {advice.kind === 'change' ? (
        <ListTick
          list="altered"
          id={measure}
          isOn={altered.includes(measure)}
          label="Done on the paper before the first cut"
        />
      ) : null}
      <ListTick list="leftOut" id={measure} isOn={!isLeftOut} isTurned label={`Take ${name.toLowerCase()} into the reading`} />
      <Disclosure summary="What it speaks about">
        <p>{needs.join(', ')}: their sum, not one of them alone.</p>
      </Disclosure>
    </li>
  );
} // prettier-ignore

function AdviceLines({ advice, unit }: { advice: CheckedDifference['advice']; unit: LengthUnit }) {
  if (advice.kind === 'leave') return <p>Leave it as drafted.</p>;
  if (advice.kind !== 'change') return <p>{advice.message}</p>;
  return <SuggestionLines suggestions={advice.suggestions} unit={unit} />;
}
