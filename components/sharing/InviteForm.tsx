'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import { Choice } from '@/components/ui/Choice';
import { FormFooter } from '@/components/ui/FormFooter';
import { SelectField } from '@/components/ui/SelectField';
import { TextField } from '@/components/ui/TextField';
import { type InviteFields, type InviteForm as Form, inviteSchema } from './sharing-schema';

interface Props {
  journalId: string;
  rounds: { id: string; number: number }[];
}

const LEVELS = [
  { value: 'read', label: 'Look only' },
  { value: 'fit', label: 'Look, mark and propose' },
] as const;
const WHOLE = 'journal';
const blank = (): Form => ({ id: v7(), email: '', level: 'fit', expiresInDays: 30 });

/** Asks one person by address, to the whole journal or to one round, for a while. */
export function InviteForm({ journalId, rounds }: Props) {
  const router = useRouter();
  const [what, setWhat] = useState(WHOLE);
  const [said, setSaid] = useState<string | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<InviteFields, unknown, Form>({
    resolver: zodResolver(inviteSchema),
    defaultValues: blank(),
  });
  const send = form.handleSubmit(async (body) => {
    const url = what === WHOLE ? `/api/journals/${journalId}/grants` : `/api/rounds/${what}/grants`;
    const sent = await sendJson('POST', url, body);
    setProblem(sent.ok ? null : sent.problem.message);
    setSaid(sent.ok ? `A letter to ${body.email} is on its way.` : null);
    if (!sent.ok) return;
    form.reset(blank());
    router.refresh();
  });
  return (
    <form onSubmit={send} noValidate className="grid max-w-xl gap-6">
      <TextField
        label="Their e-mail address"
        hint="Only an account with this address can take it up."
        type="email"
        autoComplete="off"
        error={form.formState.errors.email?.message}
        {...form.register('email')}
      />
      <SelectField label="What they see" value={what} onChange={(event) => setWhat(event.target.value)}>
        <option value={WHOLE}>The whole journal, with its photos</option>
        {rounds.map(({ id, number }) => (
          <option key={id} value={id}>
            Round {number} only
          </option>
        ))}
      </SelectField>
      <Controller
        control={form.control}
        name="level"
        render={({ field }) => (
          <Choice legend="What they may do" options={LEVELS} value={field.value} onChange={field.onChange} />
        )}
      />
      <TextField
        label="For how many days"
        hint="After that it closes by itself."
        type="number"
        inputMode="numeric"
        min={1}
        max={365}
        error={form.formState.errors.expiresInDays?.message}
        {...form.register('expiresInDays', { valueAsNumber: true })}
      />
      <FormFooter action="Send the invitation" isBusy={form.formState.isSubmitting} problem={problem} />
      <p role="status">{said}</p>
    </form>
  );
}
