'use client';
import { Controller, type UseFormReturn, useWatch } from 'react-hook-form';
import { Choice } from '@/components/ui/Choice';
import { TextArea } from '@/components/ui/TextArea';
import { TextField } from '@/components/ui/TextField';
import { CLOTH_OPTIONS, PER_CENT } from './cloth-options';
import type { PatternForm } from './pattern-schema';

export function PatternFields({ form }: { form: UseFormReturn<PatternForm> }) {
  const { register, control, formState } = form;
  const clothKind = useWatch({ control, name: 'clothKind' });
  const errors = formState.errors;
  return (
    <>
      <TextField
        label="What do you call it?"
        autoComplete="off"
        error={errors.name?.message}
        {...register('name')}
      />
      <TextField
        label="Whose draft is it?"
        hint="The maker, or “my own”. Habits are only ever compared with the same maker’s drafts."
        autoComplete="off"
        error={errors.maker?.message}
        {...register('maker')}
      />
      <Controller
        control={control}
        name="clothKind"
        render={({ field }) => (
          <Choice
            legend="Drafted for"
            options={CLOTH_OPTIONS}
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      {clothKind === 'woven' ? null : (
        <TextField
          label="Stretch it asks for, per cent across"
          inputMode="decimal"
          error={errors.stretchPercent?.message}
          {...register('stretchPercent', PER_CENT)}
        />
      )}
      <TextArea label="Notes" {...register('notes')} />
    </>
  );
}
