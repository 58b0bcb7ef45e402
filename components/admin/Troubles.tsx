import { Section } from '@/components/ui/Section';
import type { TroublesDto } from '@/db/queries/admin';

const minute = (moment: Date | string) => new Date(moment).toISOString().slice(0, 16).replace('T', ' ');

/** Letters and jobs that did not go through; what a letter says is not kept here. */
export function Troubles({ letters, jobs }: TroublesDto) {
  return (
    <div className="grid gap-10">
      <Section title="Letters">
        {letters.length === 0 ? <p>None is held up.</p> : null}
        <ul className="grid gap-2">
          {letters.map(({ id, kind, messageId, createdAt, isRefused }) => (
            <li key={id} className="[overflow-wrap:anywhere]">
              {minute(createdAt)} {kind}: {isRefused ? 'refused for good' : 'still waiting'} {messageId}
            </li>
          ))}
        </ul>
      </Section>
      <Section title="Jobs">
        {jobs.length === 0 ? <p>None has failed.</p> : null}
        <ul className="grid gap-2">
          {jobs.map(({ id, queue, state, retries, createdAt }) => (
            <li key={id} className="[overflow-wrap:anywhere]">
              {minute(createdAt)} {queue}: {state} after {retries} more tries, {id}
            </li>
          ))}
        </ul>
      </Section>
    </div>
  );
}
