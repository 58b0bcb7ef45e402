'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import { FormFooter } from '@/components/ui/FormFooter';
import { newWearer, type WearerForm, wearerSchema } from './wearer-schema';
import { WearerFields } from './WearerFields';

interface Props {
  /** Absent for a new wearer. */
  existing?: { id: string; version: number; wearer: WearerForm };
}

export function WearerEditor({ existing }: Props) {
  const router = useRouter();
  const [id] = useState(() => existing?.id ?? v7());
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<WearerForm>({
    resolver: zodResolver(wearerSchema),
    defaultValues: existing?.wearer ?? newWearer(true),
  });
  const save = form.handleSubmit(async (wearer) => {
    const sent = existing
      ? await sendJson('PATCH', `/api/wearers/${id}`, { version: existing.version, wearer })
      : await sendJson('POST', '/api/wearers', { id, wearer });
    if (!sent.ok) return setProblem(sent.problem.message);
    setProblem(null);
    router.push(`/wearers/${id}`);
    router.refresh();
  });
  return (
    <form onSubmit={save} noValidate className="grid max-w-xl gap-6">
      <WearerFields form={form} />
      <FormFooter action="Save" isBusy={form.formState.isSubmitting} problem={problem} />
    </form>
  );
}
