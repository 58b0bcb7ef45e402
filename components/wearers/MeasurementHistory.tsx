import { Amount } from '@/components/ui/Amount';
import { type Measure, MEASURES, type WaistPlace } from '@/diagnosis/measuring/measures';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

interface SetDto {
  id: string;
  measuredOn: string;
  takenAlone: boolean;
  waistPlace: WaistPlace;
  values: { measure: string; take: number; valueMm: number }[];
}

interface Props {
  sets: SetDto[];
  unit: LengthUnit;
  /** Then only what changed since the sitting before is shown. */
  isHidden: boolean;
}

const WAIST_SHORT: Record<WaistPlace, string> = {
  narrowest: 'narrowest waist',
  navel: 'waist at the navel',
  band: 'waist at the band',
};

function meanOf(set: SetDto | undefined, { id }: Measure): number | null {
  const takes = set?.values.filter(({ measure }) => measure === id).map(({ valueMm }) => valueMm) ?? [];
  return takes.length === 0 ? null : takes.reduce((sum, mm) => sum + mm, 0) / takes.length;
}

/** The sittings, newest first, a column each; what was not taken stays empty. Hidden, differences alone. */
export function MeasurementHistory({ sets, unit, isHidden }: Props) {
  if (sets.length === 0) {
    return (
      <p className="max-w-prose text-graphite">
        Nothing measured yet. Hip and thigh are enough for a first reading; a chart wants the waist too.
      </p>
    );
  }
  const taken = MEASURES.filter((measure) => sets.some((set) => meanOf(set, measure) !== null));
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Measures by day">
      <table className="w-full border-collapse text-left">
        <thead>
          <tr className="border-b-2 border-line align-bottom">
            <th className="py-2 pr-4">{isHidden ? 'What changed' : 'Measure'}</th>
            {sets.map(({ id, measuredOn, takenAlone, waistPlace }) => (
              <th key={id} scope="col" className="py-2 pr-4">
                {measuredOn}
                <span className="block text-sm font-normal text-graphite">
                  {WAIST_SHORT[waistPlace]}
                  {takenAlone ? ', alone' : ''}
                </span>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {taken.map((measure) => (
            <tr key={measure.id} className="border-b border-seam">
              <th scope="row" className="py-2 pr-4 font-normal">
                {measure.name}
              </th>
              {sets.map((set, at) => (
                <td key={set.id} className="py-2 pr-4">
                  <Cell
                    mm={meanOf(set, measure)}
                    beforeMm={meanOf(sets[at + 1], measure)}
                    unit={unit}
                    isHidden={isHidden}
                  />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

interface CellProps {
  mm: number | null;
  beforeMm: number | null;
  unit: LengthUnit;
  isHidden: boolean;
}

function Cell({ mm, beforeMm, unit, isHidden }: CellProps) {
  if (mm === null) return <span aria-label="not taken">–</span>;
  if (!isHidden) return <Amount mm={mm} unit={unit} />;
  if (beforeMm === null) return <span>taken</span>;
  return (
    <>
      {mm > beforeMm ? '+' : ''}
      <Amount mm={mm - beforeMm} unit={unit} />
    </>
  );
}
