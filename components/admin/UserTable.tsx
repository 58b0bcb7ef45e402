'use client';
import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { AdminUserDto } from '@/db/queries/admin';

const MIB = 1_048_576;
const flagWords = (user: AdminUserDto) =>
  [
    user.isAdmin && 'admin',
    user.isPatternMaker && 'pattern maker',
    user.isFitter && 'fitter',
    !user.isVerified && 'address not confirmed',
    user.isSuspended && 'suspended',
    user.isLeaving && 'closed by its owner',
  ]
    .filter(Boolean)
    .join(', ');

/** Accounts with what they take up, to be suspended and let in again. */
export function UserTable({ users, ownId }: { users: AdminUserDto[]; ownId: string }) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  const set = async (id: string, flags: { isSuspended?: boolean; isAdmin?: boolean }) => {
    const sent = await sendJson('PATCH', `/api/admin/users/${id}`, flags);
    setProblem(sent.ok ? null : sent.problem.message);
    router.refresh();
  };
  const last = users.at(-1);
  return (
    <div className="grid gap-4">
      {problem ? (
        <Notice tone="danger" role="alert">
          {problem}
        </Notice>
      ) : null}
      <ul className="grid gap-3">
        {users.map((user) => (
          <li
            key={user.id}
            className="flex flex-wrap items-center justify-between gap-3 border-b border-seam pb-3"
          >
            <span className="grid min-w-0">
              <span className="font-bold [overflow-wrap:anywhere]">
                {user.displayName}, {user.email}
              </span>
              <span className="text-sm text-graphite">
                {[flagWords(user), `${user.photos} photos, ${(user.bytes / MIB).toFixed(1)} MiB`]
                  .filter(Boolean)
                  .join('; ')}
              </span>
            </span>
            {user.id === ownId ? null : (
              <span className="flex flex-wrap gap-3">
                <Button onClick={() => void set(user.id, { isSuspended: !user.isSuspended })}>
                  {user.isSuspended ? 'Let in again' : 'Suspend'}
                </Button>
                <Button look="quiet" onClick={() => void set(user.id, { isAdmin: !user.isAdmin })}>
                  {user.isAdmin ? 'No admin any more' : 'Make an admin'}
                </Button>
              </span>
            )}
          </li>
        ))}
      </ul>
      {last ? (
        <Link
          href={`/admin?before=${last.id}`}
          className="inline-flex min-h-11 items-center text-chalk underline"
        >
          Older accounts
        </Link>
      ) : (
        <p>No accounts before these.</p>
      )}
    </div>
  );
}
