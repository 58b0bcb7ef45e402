'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';

interface Props {
  journalId: string;
  version: number;
  isSettled: boolean;
}

/** Closes the work on a garment once a round hangs clean; it can be taken up again. */
export function SettleButton({ journalId, version, isSettled }: Props) {
  const router = useRouter();
  const [problem, setProblem] = useState<string | null>(null);
  const settle = async () => {
    const sent = await sendJson('PATCH', `/api/journals/${journalId}`, { version, isSettled: !isSettled });
    setProblem(sent.ok ? null : sent.problem.message);
    router.refresh();
  };
  return (
    <span className="grid gap-1">
      <Button look={isSettled ? 'plain' : 'chalk'} onClick={() => void settle()}>
        {isSettled ? 'Take it up again' : 'Settle it'}
      </Button>
      {problem ? <span role="alert">{problem}</span> : null}
    </span>
  );
}
