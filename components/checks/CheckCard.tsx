'use client';
import { useState } from 'react';
import type { CheckAnswer, Side } from '@/components/round/evidence-state';
import { SIDE_OPTIONS } from '@/components/round/side-options';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Disclosure } from '@/components/ui/Disclosure';
import { TextField } from '@/components/ui/TextField';
import type { Check } from '@/diagnosis/garments/schema';
import { type LengthUnit, parseAmount } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';

interface Props {
  check: Check;
  answer: CheckAnswer | null;
  side: Side;
  unit: LengthUnit;
  /** What was found, and on which side. */
  onAnswer: (answer: CheckAnswer | null, side: Side) => void;
}

const EFFORT = {
  look: 'a look',
  lift: 'a lift with the hand',
  pinned: 'with pins',
  release: 'taken off, unpicked and tacked',
} as const;

/** One question that fingers or pins answer. */
export function CheckCard({ check, answer, side, unit, onAnswer }: Props) {
  const say = (edit: Partial<CheckAnswer>) => {
    const blank = { outcome: '', amount: null, amountMm: null, basis: null, places: null };
    onAnswer({ ...(answer ?? blank), ...edit }, side);
  };
  return (
    <div className="grid gap-3 border-l-4 border-seam py-2 pl-4">
      <div>
        <h3 className="font-bold">{check.question}</h3>
        <p className="text-sm text-graphite">
          {EFFORT[check.effort]}
          {check.secondPerson ? ', easier with a second person' : ''}
        </p>
      </div>
      <Disclosure summary="How to do it">
        <p>{check.how}</p>
        {check.cautions.map((caution) => (
          <p key={caution} className="border-l-4 border-basting pl-3">
            {caution}
          </p>
        ))}
      </Disclosure>
      <Choice
        legend={check.question}
        hidesLegend
        options={check.outcomes.map(({ id, name }) => ({ value: id, label: name }))}
        value={answer?.outcome ?? null}
        onChange={(outcome) => say({ outcome })}
      />
      {answer && check.sided ? (
        <Choice
          legend="On which side?"
          options={SIDE_OPTIONS}
          value={side}
          onChange={(where) => onAnswer(answer, where)}
        />
      ) : null}
      {answer && check.amount !== 'none' ? (
        <CheckAmount key={check.id} check={check} answer={answer} unit={unit} onSay={say} />
      ) : null}
      {answer ? (
        <div>
          <Button look="quiet" onClick={() => onAnswer(null, side)}>
            Not tried after all
          </Button>
        </div>
      ) : null}
    </div>
  );
}

interface AmountProps {
  check: Check;
  answer: CheckAnswer;
  unit: LengthUnit;
  onSay: (edit: Partial<CheckAnswer>) => void;
}

const PLACES = ['1', '2', '4'] as const;

/** A fold's depth is half the cloth it takes, at each place: asked as depth, said back as cloth. */
function CheckAmount({ check, answer, unit, onSay }: AmountProps) {
  const [text, setText] = useState(answer.amount?.typed ?? '');
  const isPinch = check.amount === 'pinch';
  const parsed = text.trim() === '' ? null : parseAmount(text, unit);
  const places = answer.places ?? 1;
  const read = (typed: string) => {
    setText(typed);
    const now = parseAmount(typed, unit);
    if (now.kind === 'amount' && now.mm > 0) {
      onSay({
        amount: { typed: now.typed, unit },
        amountMm: now.mm,
        basis: isPinch ? 'pinch' : null,
        places,
      });
    } else if (typed.trim() === '') onSay({ amount: null, amountMm: null, basis: null, places: null });
  };
  return (
    <div className="grid gap-3">
      <TextField
        className="max-w-60"
        label={isPinch ? 'How deep is the fold, from pin to fold edge?' : 'How wide is the gap?'}
        autoComplete="off"
        value={text}
        error={parsed && parsed.kind !== 'amount' ? parsed.message : undefined}
        onChange={(event) => read(event.target.value)}
      />
      {isPinch ? (
        <Choice
          legend="At how many places?"
          options={PLACES.map((value) => ({ value, label: value }))}
          value={String(places) as (typeof PLACES)[number]}
          onChange={(value) => onSay({ places: Number(value) })}
        />
      ) : null}
      {isPinch && parsed?.kind === 'amount' ? (
        <p aria-live="polite">That takes {amountText(2 * parsed.mm * places, unit)} of cloth.</p>
      ) : null}
    </div>
  );
}
