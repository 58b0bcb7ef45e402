'use client';
import { useCallback, useEffect, useRef, useState } from 'react';
import { v7 } from 'uuid';
import { type Sent, sendJson } from '@/components/net/send';
import type { ChangeFact } from '@/db/queries/round-facts';
import type { Basis } from '@/diagnosis/garments/schema';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { amountText } from '@/diagnosis/units/print-amount';

export interface Proposal {
  correction: string;
  side: 'left' | 'right' | 'both';
  basis: Basis | null;
  amountMm: number | null;
}

const PAUSE_MS = 500;

/** The plan of a round: at once as the person sets it, saved behind. A save that fails says so and keeps the amount in sight. */
export function usePlan(roundId: string, planned: ChangeFact[], unit: LengthUnit) {
  const [plan, setPlan] = useState(planned);
  const [problem, setProblem] = useState<string | null>(null);
  const timers = useRef(new Map<string, ReturnType<typeof setTimeout>>());
  const newest = useRef(planned);
  useEffect(() => {
    newest.current = plan;
  }, [plan]);
  const amountOf = useCallback(
    (mm: number | null) => (mm === null ? null : { typed: amountText(mm, unit), unit }),
    [unit],
  );

  const settle = useCallback((sent: Sent<ChangeFact>) => {
    setProblem(sent.ok ? null : sent.problem.message);
    if (!sent.ok) return;
    const row = sent.value;
    // The row's own planned amount is what was sent; a newer one set meanwhile stays in sight and follows.
    setPlan((now) =>
      now.map((one) => (one.id === row.id ? { ...row, plannedMm: one.plannedMm, reason: one.reason } : one)),
    );
  }, []);

  const take = useCallback(
    async ({ amountMm, ...named }: Proposal) => {
      const body = { ...named, id: v7(), reason: '', amount: amountOf(amountMm) };
      const sent = await sendJson<ChangeFact>('POST', `/api/rounds/${roundId}/changes`, body);
      setProblem(sent.ok ? null : sent.problem.message);
      if (sent.ok) setPlan((now) => [...now.filter((one) => one.id !== sent.value.id), sent.value]);
    },
    [amountOf, roundId],
  );

  const set = useCallback(
    (id: string, edit: { plannedMm?: number; reason?: string }) => {
      setPlan((now) => now.map((one) => (one.id === id ? { ...one, ...edit } : one)));
      clearTimeout(timers.current.get(id));
      timers.current.set(
        id,
        setTimeout(() => {
          const row = newest.current.find((one) => one.id === id);
          if (!row) return;
          const planned = amountOf(row.plannedMm) ?? undefined;
          const body = { version: row.version, planned, reason: row.reason };
          void sendJson<ChangeFact>('PATCH', `/api/changes/${id}`, body).then(settle);
        }, PAUSE_MS),
      );
    },
    [amountOf, settle],
  );

  const drop = useCallback(async (id: string) => {
    const sent = await sendJson('DELETE', `/api/changes/${id}`);
    setProblem(sent.ok ? null : sent.problem.message);
    if (sent.ok) setPlan((now) => now.filter((one) => one.id !== id));
  }, []);

  return { plan, problem, take, set, drop };
}
