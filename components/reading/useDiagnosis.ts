'use client';
import { useEffect, useRef, useState } from 'react';
import type { CaseInput } from '@/diagnosis/case-schema';
import type { GarmentId } from '@/diagnosis/garments/registry';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { Reading } from '@/diagnosis/reading';
import type { FromWorker, ToWorker } from './diagnosis.worker';

interface Diagnosis {
  /** Null until the worker has loaded. */
  knowledge: Knowledge | null;
  /** The newest answer; it stays while the next is computed. */
  reading: Reading | null;
}

/** Reads the case in a worker, again whenever it changes. Only the newest answer is kept. */
export function useDiagnosis(garment: GarmentId, input: CaseInput): Diagnosis {
  const worker = useRef<Worker | null>(null);
  const turn = useRef(0);
  const [knowledge, setKnowledge] = useState<Knowledge | null>(null);
  const [reading, setReading] = useState<Reading | null>(null);

  useEffect(() => {
    const made = new Worker(new URL('./diagnosis.worker.ts', import.meta.url), { type: 'module' });
    worker.current = made;
    made.onmessage = ({ data }: MessageEvent<FromWorker>) => {
      if (data.kind === 'knowledge') return setKnowledge(data.knowledge);
      if (data.turn !== turn.current) return;
      if (data.kind === 'reading') setReading(data.reading);
    };
    made.postMessage({ kind: 'open', garment } satisfies ToWorker);
    return () => {
      made.terminate();
      worker.current = null;
    };
  }, [garment]);

  useEffect(() => {
    turn.current += 1;
    worker.current?.postMessage({ kind: 'read', turn: turn.current, input } satisfies ToWorker);
  }, [garment, input]);

  return { knowledge, reading };
}
