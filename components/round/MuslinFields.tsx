'use client';
import { Controller, type UseFormReturn, useWatch } from 'react-hook-form';
import { CLOTH_OPTIONS, PER_CENT } from '@/components/patterns/cloth-options';
import { Choice } from '@/components/ui/Choice';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import type { MuslinForm } from './round-schema';

/** A new cutting: what was cut, from what. */
export function MuslinFields({ form }: { form: UseFormReturn<MuslinForm> }) {
  const { register, control, formState } = form;
  const [clothKind, cut] = useWatch({ control, name: ['clothKind', 'cut'] });
  const errors = formState.errors;
  return (
    <>
      <Controller
        control={control}
        name="cut"
        render={({ field }) => (
          <Choice
            legend="Cut as"
            options={[
              { value: 'full', label: 'Full length' },
              { value: 'shorts', label: 'Shorts' },
            ]}
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      {cut === 'shorts' ? (
        <p className="max-w-prose text-sm text-graphite">
          Shorts show depth, rises, hip and fork of a straight leg. They say nothing about a narrow or stretch
          leg; wear one full length in like cloth before the good cloth is cut.
        </p>
      ) : null}
      <Controller
        control={control}
        name="clothKind"
        render={({ field }) => (
          <Choice legend="Cloth" options={CLOTH_OPTIONS} value={field.value} onChange={field.onChange} />
        )}
      />
      {clothKind === 'woven' ? null : (
        <TextField
          label="Stretch across, per cent"
          hint="Fold it double, hold 10 cm (4 in) and pull: 12.5 cm (5 in) is 25 per cent."
          inputMode="decimal"
          error={errors.stretchPercent?.message}
          {...register('stretchPercent', PER_CENT)}
        />
      )}
      <TextField
        label="Which cloth"
        hint="For your own memory."
        autoComplete="off"
        error={errors.cloth?.message}
        {...register('cloth')}
      />
      <TextField
        label="Size cut"
        hint="As the pattern names it; a blend as “14 to 16”."
        autoComplete="off"
        error={errors.size?.message}
        {...register('size')}
      />
      <Tick label="Cut with the grain line straight" {...register('isOnGrain')} />
      <Tick label="Straight from the draft, nothing altered first" {...register('isStraightFromDraft')} />
    </>
  );
}
