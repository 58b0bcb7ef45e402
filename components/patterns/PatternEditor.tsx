'use client';
import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { v7 } from 'uuid';
import { sendJson } from '@/components/net/send';
import { FormFooter } from '@/components/ui/FormFooter';
import { newPattern, type PatternForm, patternSchema } from './pattern-schema';
import { PatternFields } from './PatternFields';

interface Props {
  /** Absent for a new pattern. */
  existing?: { id: string; version: number; pattern: PatternForm };
}

export function PatternEditor({ existing }: Props) {
  const router = useRouter();
  const [id] = useState(() => existing?.id ?? v7());
  const [problem, setProblem] = useState<string | null>(null);
  const form = useForm<PatternForm>({
    resolver: zodResolver(patternSchema),
    defaultValues: existing?.pattern ?? newPattern,
  });
  const save = form.handleSubmit(async (pattern) => {
    const sent = existing
      ? await sendJson('PATCH', `/api/patterns/${id}`, { version: existing.version, pattern })
      : await sendJson('POST', '/api/patterns', { id, pattern });
    if (!sent.ok) return setProblem(sent.problem.message);
    setProblem(null);
    router.push('/patterns');
    router.refresh();
  });
  return (
    <form onSubmit={save} noValidate className="grid max-w-xl gap-6">
      <PatternFields form={form} />
      <FormFooter action="Save" isBusy={form.formState.isSubmitting} problem={problem} />
    </form>
  );
}
