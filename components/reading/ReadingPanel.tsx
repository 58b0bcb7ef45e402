'use client';
import type { Proposal } from '@/components/plan/usePlan';
import { Disclosure } from '@/components/ui/Disclosure';
import { Notice } from '@/components/ui/Notice';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { RankedItem, Reading } from '@/diagnosis/reading';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { RankedCause } from './RankedCause';
import { RankedCorrection } from './RankedCorrection';

interface Props {
  knowledge: Knowledge;
  reading: Reading;
  unit: LengthUnit;
  planned: ReadonlySet<string>;
  onTake?: (proposal: Proposal) => void;
  onRuleOut?: (cause: string) => void;
}

const SHOWN_AT_ONCE = 4;
export const plannedKey = (id: string, side: string) => `${id}/${side}`;

/** What the marks, checks and measures say together, likeliest first. */
export function ReadingPanel({ knowledge, reading, unit, planned, onTake, onRuleOut }: Props) {
  const item = ({ kind, id, side }: RankedItem) => {
    if (kind === 'cause') {
      const row = reading.causes.find((one) => one.cause === id);
      const cause = knowledge.causes.find((one) => one.id === id);
      return row && cause ? <RankedCause key={id} row={row} cause={cause} onRuleOut={onRuleOut} /> : null;
    }
    const row = reading.corrections.find((one) => one.correction === id && one.side === side);
    const correction = knowledge.corrections.find((one) => one.id === id);
    return row && correction ? (
      <RankedCorrection
        key={plannedKey(id, side)}
        row={row}
        correction={correction}
        unit={unit}
        isPlanned={planned.has(plannedKey(id, side))}
        onTake={onTake}
      />
    ) : null;
  };
  const first = reading.ranked.slice(0, SHOWN_AT_ONCE);
  const rest = reading.ranked.slice(SHOWN_AT_ONCE);
  return (
    <div className="grid gap-5">
      {reading.doubt.level === 'none' ? null : (
        <Notice
          tone="care"
          title={reading.doubt.level === 'high' ? 'These marks do not agree yet' : 'Not settled yet'}
        >
          {reading.doubt.why}
        </Notice>
      )}
      {first.length === 0 ? (
        <p className="text-graphite">Say what you see, and what you looked for and did not find.</p>
      ) : null}
      <ol className="grid gap-5">{first.map(item)}</ol>
      {rest.length > 0 ? (
        <Disclosure summary={`${rest.length} less likely`}>
          <ol className="grid gap-5">{rest.map(item)}</ol>
        </Disclosure>
      ) : null}
      {reading.exact ? null : (
        <p className="text-sm text-graphite">
          So many marks lie in one place that this is an approximate reading.
        </p>
      )}
    </div>
  );
}
