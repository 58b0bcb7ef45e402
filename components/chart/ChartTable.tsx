import { Amount } from '@/components/ui/Amount';
import type { Chart, ChartCell } from '@/diagnosis/chart/chart';
import { MEASURES } from '@/diagnosis/measuring/measures';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

interface Props {
  chart: Chart;
  unit: LengthUnit;
  caption: string;
}

/** A chart as it was read: a row for each size, smallest first; a gap stays a gap. */
export function ChartTable({ chart, unit, caption }: Props) {
  if (chart.cells.length === 0) return null;
  const measures = MEASURES.filter(({ id }) => chart.cells.some(({ measure }) => measure === id));
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b-2 border-line">
            <th className="py-1 pr-4">Size</th>
            {measures.map(({ id, name }) => (
              <th key={id} scope="col" className="py-1 pr-4">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {chart.sizes.map((size) => (
            <tr key={size} className="border-b border-seam">
              <th scope="row" className="py-1 pr-4">
                {size}
              </th>
              {measures.map(({ id }) => (
                <td key={id} className="py-1 pr-4">
                  <CellAmount cell={chart.cells.find((one) => one.size === size && one.measure === id)} unit={unit} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
} // prettier-ignore

function CellAmount({ cell, unit }: { cell: ChartCell | undefined; unit: LengthUnit }) {
  if (!cell) return <span aria-label="not given">–</span>;
  return (
    <>
      <Amount mm={cell.valueMm} unit={unit} />
      {cell.untilMm === null ? null : (
        <>
          {' to '}
          <Amount mm={cell.untilMm} unit={unit} />
        </>
      )}
    </>
  );
}
