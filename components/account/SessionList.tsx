'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { dayWords } from '@/components/sharing/sharing-words';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { SessionDto } from '@/db/queries/sessions';

/** Every browser that is signed in, each to be ended, or all but this one at once. */
export function SessionList({ sessions }: { sessions: SessionDto[] }) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  const end = async (which: string) => {
    const sent = await sendJson('DELETE', `/api/sessions/${which}`);
    setProblem(sent.ok ? null : sent.problem.message);
    router.refresh();
  };
  return (
    <div className="grid max-w-2xl gap-4">
      {problem ? (
        <Notice tone="danger" role="alert">
          {problem}
        </Notice>
      ) : null}
      <ul className="grid gap-3">
        {sessions.map(({ handle, userAgent, createdAt, isThis }) => (
          <li
            key={handle}
            className="flex flex-wrap items-center justify-between gap-3 border-b border-seam pb-3"
          >
            <span className="grid min-w-0">
              <span className="font-bold">{isThis ? 'This browser' : 'Another browser'}</span>
              <span className="text-sm text-graphite [overflow-wrap:anywhere]">
                since {dayWords(createdAt)}; {userAgent || 'it does not say what it is'}
              </span>
            </span>
            {isThis ? null : <Button onClick={() => void end(handle)}>End it</Button>}
          </li>
        ))}
      </ul>
      {sessions.length > 1 ? (
        <div>
          <Button onClick={() => void end('others')}>End all but this one</Button>
        </div>
      ) : null}
    </div>
  );
}
