'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import { MEASURES, type MeasureId, type WaistPlace } from '@/diagnosis/measuring/measures';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { answerKey, keptTakes, openQuestions, type Sitting, unreadable, valuesOf } from './sitting';

/** The address of the measure in hand on its page. */
export const STEP_ID = 'step';

export interface SittingHead {
  measuredOn: string;
  takenAlone: boolean;
  waistPlace: WaistPlace;
}

/** One sitting with the tape while it lasts: what was typed, at which measure one is, what was answered. */
export function useSitting(wearerId: string, unit: LengthUnit, start: SittingHead, last: Sitting) {
  const router = useRouter();
  const [id] = useState(() => v7());
  const [head, setHead] = useState(start);
  const [sitting, setSitting] = useState<Sitting>({});
  const [at, setAt] = useState(0);
  const [answered, setAnswered] = useState<string[]>([]);
  const [problem, setProblem] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const measure = MEASURES[at]!;
  const takes = sitting[measure.id] ?? [''];

  const write = (measureId: MeasureId, next: string[]) =>
    setSitting((all) => ({ ...all, [measureId]: next }));
  const type = (typed: string, take = takes.length - 1) =>
    write(measure.id, takes.map((one, i) => (i === take ? typed : one))); // prettier-ignore

  const go = (to: number) => {
    setAt(Math.max(0, Math.min(MEASURES.length - 1, to)));
    // On a phone the list lies below the keys.
    document.getElementById(STEP_ID)?.scrollIntoView();
  };

  const save = async () => {
    const values = valuesOf(sitting);
    if (values.length === 0) return setProblem('Take at least one measure, then save.');
    const wrong = MEASURES.findIndex(({ id: one }) => unreadable(keptTakes(sitting[one]), unit) !== null);
    if (wrong >= 0) {
      go(wrong);
      return setProblem(unreadable(keptTakes(sitting[MEASURES[wrong]!.id]), unit));
    }
    setBusy(true);
    const sent = await sendJson('POST', `/api/wearers/${wearerId}/measurements`, { ...head, id, unit, note: '', values }); // prettier-ignore
    setBusy(false);
    if (!sent.ok) return setProblem(sent.problem.message);
    router.push(`/wearers/${wearerId}`);
    router.refresh();
  };

  return {
    head, setHead, sitting, measure, takes, at, problem, isBusy, save, type,
    go,
    again: () => write(measure.id, [...takes, '']),
    questions: openQuestions(sitting, unit, head.waistPlace, answered),
    answer: (measureId: MeasureId) => setAnswered((all) => [...all, answerKey(measureId, sitting)]),
    asOther: (measureId: MeasureId, other: LengthUnit) => write(measureId, keptTakes(sitting[measureId]).map((typed) => `${typed} ${other}`)),
    copyLast: () => setSitting((all) => ({ ...last, ...all })),
    error: unreadable(keptTakes(takes), unit),
  };
} // prettier-ignore
export type SittingState = ReturnType<typeof useSitting>;
