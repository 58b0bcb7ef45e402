'use client';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';

/** Puts the flat check into the reading of the first round again, after something was measured or chosen anew. */
export function TakeEvidence({ journalId, roundId }: { journalId: string; roundId: string }) {
  const [said, setSaid] = useState('');
  const take = async () => {
    const sent = await sendJson<{ taken: number }>('POST', `/api/rounds/${roundId}/measured`, { journalId });
    setSaid(sent.ok ? `${sent.value.taken} taken into round 1.` : sent.problem.message);
  };
  return (
    <>
      <Button onClick={() => void take()}>Take it into the reading of round 1</Button>
      <p role="status" className="self-center">
        {said}
      </p>
    </>
  );
}
