'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { v7 } from 'uuid';
import type { z } from 'zod';
import { type Sent, sendJson } from '@/components/net/send';
import { newPattern, patternSchema } from '@/components/patterns/pattern-schema';
import { PatternFields } from '@/components/patterns/PatternFields';
import { Choice } from '@/components/ui/Choice';
import { FormFooter } from '@/components/ui/FormFooter';
import { Section } from '@/components/ui/Section';
import { newWearer, wearerSchema } from '@/components/wearers/wearer-schema';
import { WearerFields } from '@/components/wearers/WearerFields';

interface Props {
  wearers: { id: string; name: string }[];
  patterns: { draftId: string; name: string }[];
}

const NEW = 'new';

/** The ids are made once and here, so that a second try after a lost connection makes nothing twice. */
const makeIds = () => ({ wearer: v7(), pattern: v7(), journal: v7() });

async function saveAll(
  ids: ReturnType<typeof makeIds>,
  wearer: { id: string } | { form: z.infer<typeof wearerSchema> },
  pattern: { draftId: string; name: string } | { form: z.infer<typeof patternSchema> },
): Promise<Sent<{ id: string }>> {
  if ('form' in wearer) {
    const sent = await sendJson<{ id: string }>('POST', '/api/wearers', {
      id: ids.wearer,
      wearer: wearer.form,
    });
    if (!sent.ok) return sent;
  }
  let patternDraftId = 'draftId' in pattern ? pattern.draftId : '';
  if ('form' in pattern) {
    const body = { id: ids.pattern, pattern: pattern.form };
    const sent = await sendJson<{ draftId: string }>('POST', '/api/patterns', body);
    if (!sent.ok) return sent;
    patternDraftId = sent.value.draftId;
  }
  return sendJson('POST', '/api/journals', {
    id: ids.journal,
    name: 'form' in pattern ? pattern.form.name : pattern.name,
    wearerId: 'id' in wearer ? wearer.id : ids.wearer,
    patternDraftId,
  });
}

/** A garment in work: for whom, from which draft. Both can be made here and now. */
export function NewGarmentForm({ wearers, patterns }: Props) {
  const router = useRouter();
  const [ids] = useState(makeIds);
  const [wearerId, setWearerId] = useState(wearers[0]?.id ?? NEW);
  const [draftId, setDraftId] = useState(NEW);
  const [problem, setProblem] = useState<string | null>(null);
  const [isBusy, setBusy] = useState(false);
  const wearer = useForm({
    resolver: zodResolver(wearerSchema),
    defaultValues: newWearer(wearers.length === 0),
  });
  const pattern = useForm({ resolver: zodResolver(patternSchema), defaultValues: newPattern });

  const save = async () => {
    const chosen = patterns.find((one) => one.draftId === draftId);
    const fits = [wearerId !== NEW || (await wearer.trigger()), chosen ? true : await pattern.trigger()];
    if (fits.includes(false)) return setProblem('One or two fields above need another look.');
    setBusy(true);
    const sent = await saveAll(
      ids,
      wearerId === NEW ? { form: wearer.getValues() } : { id: wearerId },
      chosen ?? { form: pattern.getValues() },
    );
    setBusy(false);
    if (!sent.ok) return setProblem(sent.problem.message);
    router.push(`/journals/${sent.value.id}/rounds/new`);
  };

  return (
    <form
      noValidate
      className="grid max-w-2xl gap-8"
      onSubmit={(event) => {
        event.preventDefault();
        void save();
      }}
    >
      <Section title="For whom">
        {wearers.length > 0 ? (
          <Choice
            legend="Wearer"
            hidesLegend
            options={[
              ...wearers.map(({ id, name }) => ({ value: id, label: name })),
              { value: NEW, label: 'Someone new' },
            ]}
            value={wearerId}
            onChange={setWearerId}
          />
        ) : null}
        {wearerId === NEW ? <WearerFields form={wearer} /> : null}
      </Section>
      <Section title="From which pattern">
        {patterns.length > 0 ? (
          <Choice
            legend="Pattern"
            hidesLegend
            options={[
              ...patterns.map((one) => ({ value: one.draftId, label: one.name })),
              { value: NEW, label: 'A new one' },
            ]}
            value={draftId}
            onChange={setDraftId}
          />
        ) : null}
        {draftId === NEW ? <PatternFields form={pattern} /> : null}
      </Section>
      <FormFooter action="Hang it on the rail" isBusy={isBusy} problem={problem} />
    </form>
  );
}
