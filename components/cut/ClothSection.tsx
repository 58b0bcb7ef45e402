import { Notice } from '@/components/ui/Notice';
import type { ClothVerdict } from '@/diagnosis/ease/cloth-verdict';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import type { CutChoices } from '@/db/queries/cuts';
import { GaugeForm } from './GaugeForm';
import { Shrinkage } from './Shrinkage';

interface Props {
  gauge: CutChoices['gauge'];
  verdict: ClothVerdict | null;
  unit: LengthUnit;
}

const TONES = { suits: 'clean', more: 'care', 'too-little': 'danger' } as const;

/** The cloth beside the draft: its gauge, and a plain word on it. */
export function ClothSection({ gauge, verdict, unit }: Props) {
  return (
    <>
      <GaugeForm gauge={gauge} unit={unit} />
      {verdict ? (
        <Notice tone={TONES[verdict.kind]} role="status">
          <p>{verdict.message}</p>
          {verdict.cautions.map((caution) => (
            <p key={caution}>{caution}</p>
          ))}
        </Notice>
      ) : null}
      <p className="max-w-prose text-sm text-graphite">
        At most half of the stretch is used round the body, and none along it unless the cloth stretches
        along.
      </p>
      <Shrinkage unit={unit} />
    </>
  );
}
