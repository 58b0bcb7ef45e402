'use client';
import { X } from 'lucide-react';
import { useId } from 'react';
import { Choice } from '@/components/ui/Choice';
import type { Sign } from '@/diagnosis/garments/schema';
import type { Side } from '@/components/round/evidence-state';
import { SIDE_OPTIONS } from '@/components/round/side-options';

export const STRENGTHS = ['Not there', 'Faint', 'Clear', 'Pulling'] as const;

interface Props {
  sign: Sign;
  severity: number | null;
  side: Side;
  onChange: (severity: number | null, side: Side) => void;
}

/** One sign and what was seen of it. Nothing chosen means: not looked at. */
export function SignRow({ sign, severity, side, onChange }: Props) {
  const id = useId();
  return (
    <div
      role="group"
      aria-labelledby={id}
      className="grid gap-2 border-l-4 border-transparent py-3 pl-3 has-checked:border-ink"
    >
      <div className="flex items-start justify-between gap-2">
        <div>
          <h3 id={id} className="font-bold">
            {sign.name}
          </h3>
          <p className="max-w-prose text-sm text-graphite">{sign.description}</p>
        </div>
        {severity === null ? null : (
          <button
            type="button"
            className="inline-flex size-11 shrink-0 items-center justify-center text-graphite hover:text-ink"
            aria-label={`Not looked at: ${sign.name}`}
            onClick={() => onChange(null, side)}
          >
            <X aria-hidden size={20} />
          </button>
        )}
      </div>
      <Choice
        legend={sign.name}
        hidesLegend
        options={STRENGTHS.map((label, value) => ({ value: String(value), label }))}
        value={severity === null ? null : String(severity)}
        onChange={(value) => onChange(Number(value), side)}
      />
      {sign.sided && severity !== null && severity > 0 ? (
        <Choice
          legend="Where"
          hidesLegend
          options={SIDE_OPTIONS}
          value={side}
          onChange={(value) => onChange(severity, value)}
        />
      ) : null}
    </div>
  );
}
