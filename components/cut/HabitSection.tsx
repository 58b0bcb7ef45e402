import { Amount } from '@/components/ui/Amount';
import type { Habit } from '@/diagnosis/flat-check/habits';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';

/** What fitted before, from the same hand, as differences to this draft. */
export function HabitSection({ habits, unit }: { habits: readonly Habit[]; unit: LengthUnit }) {
  if (habits.length === 0)
    return (
      <p className="max-w-prose text-graphite">
        Finished measures of garments that fitted come back here, beside drafts of the same maker in the same kind of cloth.
      </p>
    ); // prettier-ignore
  return (
    <ul className="grid max-w-2xl list-disc gap-1 pl-5">
      {habits.map(({ measure, name, differenceMm, garments }) => (
        <li key={measure}>
          {name}: what fitted ({garments.join(', ')}) is <Amount mm={Math.abs(differenceMm)} unit={unit} />{' '}
          {differenceMm >= 0 ? 'more' : 'less'} than this draft gives.
        </li>
      ))}
    </ul>
  );
}
