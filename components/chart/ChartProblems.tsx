import type { ChartProblem } from '@/diagnosis/chart/parse-chart';

const SHOWN = 12;

/** Each cell that could not be read, by its place, with what stands there. */
export function ChartProblems({ problems, more }: { problems: readonly ChartProblem[]; more: number }) {
  const rest = Math.max(0, problems.length - SHOWN) + more;
  return (
    <div role="status" className="border-l-4 border-basting bg-paper px-4 py-3">
      <p className="font-bold">
        {problems.length + more === 1 ? 'One cell needs' : `${problems.length + more} cells need`} another
        look
      </p>
      <ul className="mt-1 grid gap-1">
        {problems.slice(0, SHOWN).map(({ row, column, where, typed, message }, at) => (
          <li key={`${row} ${column} ${at}`} className="[overflow-wrap:anywhere]">
            <span className="font-bold">{where}</span>
            {typed === '' ? '' : ` (“${typed.slice(0, 40)}”)`}: {message}
          </li>
        ))}
      </ul>
      {rest > 0 ? <p>And {rest} more.</p> : null}
    </div>
  );
}
