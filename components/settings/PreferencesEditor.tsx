'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { sendJson } from '@/components/net/send';
import { Choice } from '@/components/ui/Choice';
import { FormFooter } from '@/components/ui/FormFooter';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import { type PreferencesForm, preferencesSchema } from './preferences-schema';

const UNITS = [
  { value: 'cm', label: 'Centimetres' },
  { value: 'in', label: 'Inches' },
] as const;

/** How Ruckle speaks to this person. */
export function PreferencesEditor({ preferences }: { preferences: PreferencesForm }) {
  const router = useRouter();
  const [said, setSaid] = useState<string | null>(null);
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<PreferencesForm>({
    resolver: zodResolver(preferencesSchema),
    defaultValues: preferences,
  });
  const save = form.handleSubmit(async (body) => {
    const sent = await sendJson('PATCH', '/api/me', body);
    setProblem(sent.ok ? null : sent.problem.message);
    setSaid(sent.ok ? 'Saved.' : null);
    router.refresh();
  });
  return (
    <form onSubmit={save} noValidate className="grid max-w-xl gap-6">
      <TextField
        label="Your name here"
        autoComplete="nickname"
        error={form.formState.errors.displayName?.message}
        {...form.register('displayName')}
      />
      <Controller
        control={form.control}
        name="unit"
        render={({ field }) => (
          <Choice legend="Your tape" options={UNITS} value={field.value} onChange={field.onChange} />
        )}
      />
      <Tick label="Hide my measurements: show differences only" {...form.register('hidesMeasurements')} />
      <FormFooter action="Save" isBusy={form.formState.isSubmitting} problem={problem} />
      <p role="status">{said}</p>
    </form>
  );
}
