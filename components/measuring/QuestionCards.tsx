'use client';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import { MEASURES } from '@/diagnosis/measuring/measures';
import type { SittingState } from './useSitting';

/** What is worth asking once. Nothing is changed but by a button, and "keep it" is always one. */
export function QuestionCards({ state: { questions, answer, asOther, go } }: { state: SittingState }) {
  if (questions.length === 0) return null;
  return (
    <div className="grid gap-3" role="status">
      {questions.map((question) => (
        <Notice key={question.measure} tone="care">
          <p>{question.message}</p>
          <div className="mt-2 flex flex-wrap gap-2">
            {question.kind === 'other-unit' ? (
              <Button onClick={() => asOther(question.measure, question.unit)}>
                {question.unit === 'in' ? 'Yes, inches' : 'Yes, centimetres'}
              </Button>
            ) : (
              <Button onClick={() => go(MEASURES.findIndex(({ id }) => id === question.measure))}>
                Measure it once more
              </Button>
            )}
            <Button onClick={() => answer(question.measure)}>It is right, keep it</Button>
          </div>
        </Notice>
      ))}
    </div>
  );
}
