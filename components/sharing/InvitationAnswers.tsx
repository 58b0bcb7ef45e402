'use client';
import type { Route } from 'next';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';
import { Notice } from '@/components/ui/Notice';
import type { InvitationAnswer } from './sharing-schema';

interface Props {
  url: string;
  extra?: { token: string };
}

export function InvitationAnswers({ url, extra }: Props) {
  const router = useRouter();
  const [isBusy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const send = async (answer: InvitationAnswer) => {
    setBusy(true);
    const sent = await sendJson<{ path: string }>('POST', url, { ...extra, answer });
    setBusy(false);
    if (sent.ok) {
      router.push(sent.value.path as Route);
      return router.refresh();
    }
    setProblem(
      sent.status === 404
        ? 'This invitation is for another address, or has ended. It was not used up.'
        : sent.problem.message,
    );
  };
  return (
    <div className="grid gap-4">
      {problem ? (
        <Notice tone="danger" role="alert">
          {problem}
        </Notice>
      ) : null}
      <div className="flex flex-wrap gap-3">
        <Button look="chalk" disabled={isBusy} onClick={() => void send('accept')}>
          Yes, I will look
        </Button>
        <Button disabled={isBusy} onClick={() => void send('decline')}>
          No, thank you
        </Button>
        <Button look="quiet" disabled={isBusy} onClick={() => void send('block')}>
          No, and none from them again
        </Button>
      </div>
    </div>
  );
}
