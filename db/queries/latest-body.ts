import 'server-only';
import { sql } from 'drizzle-orm';

/** The newest value of each measure that sizes a body, mm: `{ hip: 1020, … }`. */
export const latestBody = sql<Partial<Record<'waist' | 'hip' | 'thigh' | 'knee' | 'calf', number>>>`(
  select coalesce(json_object_agg(latest.measure, latest.value_mm), '{}') from (
    select distinct on (m.measure) m.measure, m.value_mm
    from measurements m join measurement_sets s on s.id = m.set_id
    where s.wearer_id = wearers.id and s.deleted_at is null and m.measure in ('waist', 'hip', 'thigh', 'knee', 'calf')
    order by m.measure, s.measured_on desc, s.id desc, m.take
  ) latest)`;
