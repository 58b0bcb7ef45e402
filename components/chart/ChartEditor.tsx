'use client';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sendJson } from '@/components/net/send';
import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { TextArea } from '@/components/ui/TextArea';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import type { ChartKind } from '@/diagnosis/chart/chart';
import { parseChart } from '@/diagnosis/chart/parse-chart';
import type { LengthUnit } from '@/diagnosis/units/parse-amount';
import { ChartProblems } from './ChartProblems';
import { ChartTable } from './ChartTable';
import { KIND_WORDS } from './kind-words';
import { useKeptText } from './useKeptText';

interface Props {
  patternId: string;
  kind: ChartKind;
  unit: LengthUnit;
  /** The table as it is kept, to be changed. */
  kept: string;
}

const UNITS = [
  { value: 'cm' as const, label: 'Centimetres' },
  { value: 'in' as const, label: 'Inches' },
];

/** A table typed or pasted, shown as it is read before it is kept; what was pasted stays until it was. */
export function ChartEditor({ patternId, kind, unit: own, kept }: Props) {
  const router = useRouter();
  const text = useKeptText(`chart ${patternId} ${kind}`, kept);
  const [unit, setUnit] = useState(own);
  const [allowance, setAllowance] = useState('');
  const [leavesOut, setLeavesOut] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const preview = text.value.trim() === '' ? null : parseChart(text.value, unit);
  const hasProblems = (preview?.problems.length ?? 0) > 0;

  const save = async () => {
    setBusy(true);
    const over = allowance.trim();
    const body = { kind, unit, pasted: text.value, leavesOut, allowance: over === '' ? null : { typed: over, unit } };
    const sent = await sendJson('PUT', `/api/patterns/${patternId}/chart`, body);
    setBusy(false);
    if (!sent.ok) return setProblem(sent.problem.message);
    setProblem(null);
    text.forget();
    router.refresh();
  };

  return (
    <div className="grid gap-4">
      <p className="max-w-prose text-graphite">{KIND_WORDS[kind].lead}</p>
      <Choice legend="A bare number is in" options={UNITS} value={unit} onChange={setUnit} />
      <p className="max-w-prose text-sm text-graphite">
        A row for each size and a heading for each measure, or the other way round. From a spreadsheet, or with commas
        between. 72, 28 1/2 in, 88–92 and gaps are all right.
      </p>
      <TextArea
        label={`${KIND_WORDS[kind].title}: type or paste`}
        rows={6}
        spellCheck={false}
        value={text.value}
        onChange={(event) => text.set(event.target.value)}
      />
      {preview ? <ChartTable chart={preview.chart} unit={unit} caption={`${KIND_WORDS[kind].title}, as read`} /> : null}
      {preview && hasProblems ? <ChartProblems problems={preview.problems} more={preview.moreProblems} /> : null}
      {preview && hasProblems && preview.chart.cells.length > 0 ? (
        <Tick
          label="Keep what could be read, leave those cells out"
          checked={leavesOut}
          onChange={(event) => setLeavesOut(event.target.checked)}
        />
      ) : null}
      {kind === 'paper' ? (
        <TextField
          label="Allowance that the tape ran over"
          hint="Leave it empty when you measured along the seamlines."
          placeholder={unit}
          autoComplete="off"
          maxLength={24}
          value={allowance}
          onChange={(event) => setAllowance(event.target.value)}
        />
      ) : null}
      {problem ? (
        <p role="alert" className="border-l-4 border-pin bg-paper px-3 py-2 font-bold">
          {problem}
        </p>
      ) : null}
      <Button
        look={kind === 'body' ? 'chalk' : 'plain'}
        className="justify-self-start"
        onClick={() => void save()}
        disabled={isBusy || text.value === kept || (hasProblems && !leavesOut)}
      >
        {isBusy ? 'Saving…' : `Keep: ${KIND_WORDS[kind].title.toLowerCase()}`}
      </Button>
    </div>
  );
} // prettier-ignore
