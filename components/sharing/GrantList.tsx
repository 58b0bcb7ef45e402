'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { GrantDto } from '@/db/queries/sharing';
import { grantWords } from './sharing-words';

/** Everyone this was opened to, with what became of it; taking back holds from their next request on. */
export function GrantList({ grants }: { grants: GrantDto[] }) {
  const router = useRouter();
  const [said, setSaid] = useState<{ isWrong: boolean; words: string } | null>(null);
  const send = async (method: 'POST' | 'DELETE', url: string, words: string) => {
    const sent = await sendJson(method, url);
    setSaid(sent.ok ? { isWrong: false, words } : { isWrong: true, words: sent.problem.message });
    router.refresh();
  };
  if (grants.length === 0)
    return (
      <p className="max-w-prose text-graphite">
        Nobody. What you record here is seen by you alone until you open it to someone by name.
      </p>
    );
  return (
    <div className="grid gap-4">
      {said ? (
        <Notice tone={said.isWrong ? 'danger' : 'clean'} role={said.isWrong ? 'alert' : 'status'}>
          {said.words}
        </Notice>
      ) : null}
      <ul className="grid max-w-2xl gap-4">
        {grants.map((grant) => (
          <li key={grant.id} className="grid gap-2 border-l-4 border-seam pl-4">
            <span className="font-bold [overflow-wrap:anywhere]">{grant.email}</span>
            <span>{grantWords(grant)}</span>
            {grant.state === 'open' || grant.state === 'waiting' ? (
              <span className="flex flex-wrap gap-3">
                {grant.state === 'waiting' ? (
                  <Button
                    onClick={() => void send('POST', `/api/grants/${grant.id}/resend`, 'A new letter is on its way.')} // prettier-ignore
                  >
                    Send the letter again
                  </Button>
                ) : null}
                <Button
                  aria-label={`Take it back from ${grant.email}`}
                  onClick={() => void send('DELETE', `/api/grants/${grant.id}`, 'Taken back. They see nothing of it any more.')} // prettier-ignore
                >
                  Take it back
                </Button>
              </span>
            ) : null}
          </li>
        ))}
      </ul>
    </div>
  );
}
