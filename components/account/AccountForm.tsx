'use client';
import { type FormEvent, type ReactNode, useActionState, useState } from 'react';
import { z } from 'zod';
import { FormFooter } from '@/components/ui/FormFooter';
import { Notice } from '@/components/ui/Notice';
import { TextField } from '@/components/ui/TextField';
import type { FormState } from '@/lib/request/action';

export interface AccountFieldSpec {
  name: string;
  label: string;
  type: 'email' | 'password' | 'text';
  autoComplete: string;
  hint?: string;
}

interface Props {
  action: (before: FormState, form: FormData) => Promise<FormState>;
  schema: z.ZodType;
  fields: AccountFieldSpec[];
  hidden?: Record<string, string>;
  submit: string;
  /** Stands in place of the form once it is done. */
  doneWords?: ReactNode;
}

/**
 * An account form. It is sent as it stands where JavaScript has not loaded yet; where it has, faults are named before anything
 * is sent, by the same schema.
 */
export function AccountForm({ action, schema, fields, hidden = {}, submit, doneWords }: Props) {
  const [state, send, isBusy] = useActionState(action, {});
  const [early, setEarly] = useState<Record<string, string[]> | null>(null);
  const faults = early ?? state.fields ?? {};
  const check = (event: FormEvent<HTMLFormElement>) => {
    const parsed = schema.safeParse(Object.fromEntries(new FormData(event.currentTarget)));
    if (parsed.success) return setEarly(null);
    event.preventDefault();
    setEarly(z.flattenError(parsed.error).fieldErrors as Record<string, string[]>);
  };
  if (state.isDone)
    return (
      <Notice tone="clean" role="status">
        {doneWords}
      </Notice>
    );
  return (
    <form action={send} onSubmit={check} noValidate className="grid gap-5">
      {Object.entries(hidden).map(([name, value]) => (
        <input key={name} type="hidden" name={name} value={value} />
      ))}
      {fields.map(({ name, ...field }) => (
        <TextField
          key={name}
          name={name}
          {...field}
          defaultValue={state.values?.[name]}
          error={faults[name]?.[0]}
          required
        />
      ))}
      <FormFooter action={submit} isBusy={isBusy} problem={state.message ?? faults.token?.[0] ?? null} />
    </form>
  );
}
