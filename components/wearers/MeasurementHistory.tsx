import { Amount } from '@/components/ui/Amount';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { MEASURE_WORDS, MEASURES } from './measurement-schema';

interface Props {
  sets: {
    id: string;
    measuredOn: string;
    takenAlone: boolean;
    values: { measure: string; valueMm: number }[];
  }[];
  unit: LengthUnit;
}

/** The sittings, newest first; what was not taken stays empty. */
export function MeasurementHistory({ sets, unit }: Props) {
  if (sets.length === 0) {
    return (
      <p className="max-w-prose text-graphite">
        Nothing measured yet. Hip and thigh are enough for a first reading.
      </p>
    );
  }
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Measures by day">
      <table className="w-full border-collapse text-left">
        <thead>
          <tr className="border-b-2 border-line">
            <th className="py-2 pr-4">Day</th>
            {MEASURES.map((measure) => (
              <th key={measure} className="py-2 pr-4">
                {MEASURE_WORDS[measure].label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {sets.map((set) => (
            <tr key={set.id} className="border-b border-seam">
              <th scope="row" className="py-2 pr-4 font-normal">
                {set.measuredOn}
                {set.takenAlone ? <span className="text-sm text-graphite"> alone</span> : null}
              </th>
              {MEASURES.map((measure) => {
                const value = set.values.find((one) => one.measure === measure);
                return (
                  <td key={measure} className="py-2 pr-4">
                    {value ? (
                      <Amount mm={value.valueMm} unit={unit} />
                    ) : (
                      <span aria-label="not taken">–</span>
                    )}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
