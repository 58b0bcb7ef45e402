'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Amount } from '@/components/ui/Amount';
import { Button } from '@/components/ui/Button';
import { Section } from '@/components/ui/Section';
import type { DeskRoundDto } from '@/db/queries/desk';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

interface Props {
  measured: DeskRoundDto['measured'];
  unit: LengthUnit;
  isOwner: boolean;
}

/** What the tape told before the first cut, as it stands in the reading of this round. Each can be taken out. */
export function MeasuredEvidence({ measured, unit, isOwner }: Props) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  if (measured.length === 0) return null;
  const remove = async (id: string) => {
    const sent = await sendJson('DELETE', `/api/measured/${id}`);
    setProblem(sent.ok ? null : sent.problem.message);
    router.refresh();
  };
  return (
    <Section title="Measured before the first cut" id="measured">
      {problem ? <p role="alert">{problem}</p> : null}
      <ul className="grid max-w-2xl border-t border-seam">
        {measured.map(({ id, label, needMm, sdMm }) => (
          <li key={id} className="flex flex-wrap items-center justify-between gap-3 border-b border-seam py-1">
            <span>
              <span className="font-bold">{label}</span>: {needMm > 0 ? '+' : ''}
              <Amount mm={needMm} unit={unit} />
              <span className="text-graphite">
                {' '}
                give or take <Amount mm={sdMm} unit={unit} rounding="up" />
              </span>
            </span>
            {isOwner ? (
              <Button look="quiet" aria-label={`Take ${label} out of the reading`} onClick={() => void remove(id)}>
                Take out
              </Button>
            ) : null}
          </li>
        ))}
      </ul>
    </Section>
  );
} // prettier-ignore
