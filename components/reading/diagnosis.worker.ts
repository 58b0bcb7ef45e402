import { parseCase } from '@/diagnosis/case';
import type { CaseInput } from '@/diagnosis/case-schema';
import { diagnose } from '@/diagnosis/diagnose';
import { type GarmentId, knowledgeOf } from '@/diagnosis/garments/registry';
import type { Knowledge } from '@/diagnosis/garments/schema';
import type { Reading } from '@/diagnosis/reading';

export type ToWorker =
  { kind: 'open'; garment: GarmentId } | { kind: 'read'; turn: number; input: CaseInput };
export type FromWorker =
  | { kind: 'knowledge'; knowledge: Knowledge }
  | { kind: 'reading'; turn: number; reading: Reading }
  | { kind: 'refused'; turn: number; message: string };

let knowledge: Knowledge | null = null;

const answer = (message: FromWorker) => self.postMessage(message);

/** The same core as on the server, off the drawing thread. It needs no network once it is loaded. */
self.onmessage = ({ data }: MessageEvent<ToWorker>) => {
  if (data.kind === 'open') {
    knowledge = knowledgeOf(data.garment);
    return answer({ kind: 'knowledge', knowledge });
  }
  if (!knowledge) return;
  const parsed = parseCase(knowledge, data.input);
  if (!parsed.ok) return answer({ kind: 'refused', turn: data.turn, message: parsed.fault.message });
  answer({ kind: 'reading', turn: data.turn, reading: diagnose(knowledge, parsed.value) });
};
