'use client';
import { Button } from '@/components/ui/Button';
import { FormFooter } from '@/components/ui/FormFooter';
import { Section } from '@/components/ui/Section';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { MeasureList } from './MeasureList';
import { MeasureStep } from './MeasureStep';
import { QuestionCards } from './QuestionCards';
import type { Sitting } from './sitting';
import { SittingFields } from './SittingFields';
import { type SittingHead, useSitting } from './useSitting';

interface Props {
  wearerId: string;
  unit: LengthUnit;
  start: SittingHead;
  /** What was typed in the last sitting; empty where there was none, or measures are hidden. */
  last: Sitting;
}

/** Measures from the waist down, one after another, any of them left out. */
export function MeasureFlow({ wearerId, unit, start, last }: Props) {
  const state = useSitting(wearerId, unit, start, last);
  const hasLast = Object.keys(last).length > 0;
  return (
    <form
      noValidate
      className="grid gap-8 lg:grid-cols-[minmax(0,26rem)_minmax(0,1fr)]"
      onSubmit={(event) => {
        event.preventDefault();
        void state.save();
      }}
    >
      <div className="grid content-start gap-6">
        <Section title="Before you begin">
          <SittingFields head={state.head} onChange={state.setHead} />
          {hasLast ? (
            <div className="grid gap-1">
              <Button onClick={state.copyLast} className="justify-self-start">
                Copy the last sitting
              </Button>
              <p className="text-sm text-graphite">Then change only what you measure again.</p>
            </div>
          ) : null}
        </Section>
        <MeasureStep state={state} unit={unit} last={last[state.measure.id] ?? []} />
      </div>
      <div className="grid content-start gap-6">
        <QuestionCards state={state} />
        <Section title="This sitting">
          <MeasureList state={state} />
        </Section>
        <FormFooter action="Save this sitting" isBusy={state.isBusy} problem={state.problem} />
      </div>
    </form>
  );
}
