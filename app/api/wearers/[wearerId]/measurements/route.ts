import { z } from 'zod';
import { measurementSetSchema } from '@/components/wearers/measurement-schema';
import { addMeasurementSet, listMeasurementSets } from '@/db/queries/measurements';
import { readAmount } from '@/lib/request/read-amount';
import { route } from '@/lib/request/route';
import { orNotFound } from '@/lib/request/written';

const params = z.object({ wearerId: z.uuid() });

export const POST = route(
  { access: 'viewer', params, body: measurementSetSchema },
  async ({ viewer, params, body: { id, unit, values, ...set } }) => {
    const read = values.map(({ measure, take, typed }) => {
      const { mm, typed: kept } = readAmount({ typed, unit }, measure);
      return { measure, take: take ?? 1, valueMm: mm, typed: kept };
    });
    orNotFound(await addMeasurementSet(viewer, params.wearerId, id, { ...set, values: read }));
    return listMeasurementSets(viewer, params.wearerId);
  },
);
