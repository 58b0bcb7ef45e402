import Link from 'next/link';
import { Button } from '@/components/ui/Button';
import { TextField } from '@/components/ui/TextField';
import type { AuditDto, AuditFilter } from '@/db/queries/admin';

interface Props {
  entries: AuditDto[];
  filter: AuditFilter;
}

/** The audit, narrowed by a form that needs no JavaScript. */
export function AuditTable({ entries, filter }: Props) {
  const last = entries.at(-1);
  const query = { ...filter, before: last?.id };
  return (
    <div className="grid gap-6">
      <form method="get" className="flex flex-wrap items-end gap-3">
        <TextField label="Who (id)" name="actorId" defaultValue={filter.actorId} />
        <TextField label="Did" name="verb" defaultValue={filter.verb} />
        <TextField label="To a" name="objectKind" defaultValue={filter.objectKind} />
        <Button type="submit">Narrow</Button>
      </form>
      <ul className="grid gap-2">
        {entries.map(({ id, at, actorId, verb, objectKind, objectId, fields }) => (
          <li key={id} className="text-sm [overflow-wrap:anywhere]">
            {at.toISOString().slice(0, 19).replace('T', ' ')} {actorId ?? 'nobody'} {verb} {objectKind}{' '}
            {objectId ?? ''} {fields.join(', ')}
          </li>
        ))}
      </ul>
      {last ? (
        <Link
          href={{ pathname: '/admin/audit', query }}
          className="inline-flex min-h-11 items-center text-chalk underline"
        >
          Older
        </Link>
      ) : (
        <p>Nothing more.</p>
      )}
    </div>
  );
}
