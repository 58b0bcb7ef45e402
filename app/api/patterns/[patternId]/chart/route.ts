import { z } from 'zod';
import { chartSchema } from '@/components/patterns/chart-schema';
import { savePatternTable } from '@/db/queries/charts';
import { parseChart } from '@/diagnosis/chart/parse-chart';
import { Problem } from '@/lib/request/problem';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

const params = z.object({ patternId: z.uuid() });

export const PUT = route(
  { access: 'viewer', params, body: chartSchema },
  async ({ viewer, params, body: { kind, unit, pasted, leavesOut } }) => {
    const { chart, problems } = parseChart(pasted, unit);
    if (pasted.trim() !== '' && problems.length > 0 && (!leavesOut || chart.cells.length === 0)) {
      const fields = { pasted: problems.map(({ where, message }) => `${where}: ${message}`) };
      throw new Problem(422, 'invalid', 'Some cells need another look.', { fields });
    }
    const cells = chart.cells.map((cell) => ({ ...cell, sizeOrdinal: chart.sizes.indexOf(cell.size) }));
    orNotFound(await savePatternTable(viewer, params.patternId, kind, cells));
    return { sizes: chart.sizes.length, cells: cells.length };
  },
);
