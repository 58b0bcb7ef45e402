import { z } from 'zod';
import { chartSchema } from '@/components/patterns/chart-schema';
import { savePatternTable } from '@/db/queries/charts';
import { withoutAllowances } from '@/diagnosis/flat-check/allowances';
import { parseChart } from '@/diagnosis/chart/parse-chart';
import { readAmount } from '@/lib/request/read-amount';
import { Problem } from '@/lib/request/problem';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

const params = z.object({ patternId: z.uuid() });

export const PUT = route(
  { access: 'viewer', params, body: chartSchema },
  async ({ viewer, params, body: { kind, unit, pasted, allowance, leavesOut } }) => {
    const { chart, problems } = parseChart(pasted, unit);
    if (pasted.trim() !== '' && problems.length > 0 && (!leavesOut || chart.cells.length === 0)) {
      const fields = { pasted: problems.map(({ where, message }) => `${where}: ${message}`) };
      throw new Problem(422, 'invalid', 'Some cells need another look.', { fields });
    }
    const over = allowance ? readAmount(allowance, 'allowance') : null;
    const sewn = over ? withoutAllowances(chart, over.mm) : chart;
    if (!sewn)
      throw new Problem(422, 'invalid', 'With that allowance taken out nothing is left of a measure.', {
        fields: { allowance: ['With that allowance taken out nothing is left of a measure.'] },
      });
    const cells = sewn.cells.map((cell) => ({ ...cell, sizeOrdinal: sewn.sizes.indexOf(cell.size) }));
    orNotFound(await savePatternTable(viewer, params.patternId, kind, cells));
    return { sizes: chart.sizes.length, cells: cells.length };
  },
);
