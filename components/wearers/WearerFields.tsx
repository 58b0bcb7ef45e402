'use client';
import { Controller, type UseFormReturn, useWatch } from 'react-hook-form';
import { Choice } from '@/components/ui/Choice';
import { TextField } from '@/components/ui/TextField';
import { Tick } from '@/components/ui/Tick';
import type { WearerForm } from './wearer-schema';

/** Who is sewn for. Nothing is asked that the fitting does not need: no age, no weight, no body type. */
export function WearerFields({ form }: { form: UseFormReturn<WearerForm> }) {
  const { register, control, formState } = form;
  const isSelf = useWatch({ control, name: 'isSelf' });
  const errors = formState.errors;
  return (
    <>
      <Controller
        control={control}
        name="isSelf"
        render={({ field }) => (
          <Choice
            legend="Who is it?"
            options={[
              { value: 'self', label: 'Myself' },
              { value: 'other', label: 'Someone else' },
            ]}
            value={field.value ? 'self' : 'other'}
            onChange={(value) => field.onChange(value === 'self')}
          />
        )}
      />
      <TextField
        label="Name"
        hint="Initials or a made-up name will do."
        autoComplete="off"
        error={errors.name?.message}
        {...register('name')}
      />
      <Controller
        control={control}
        name="fittedFor"
        render={({ field }) => (
          <Choice
            legend="Fitted for"
            options={[
              { value: 'standing', label: 'Standing' },
              { value: 'both', label: 'Standing and sitting' },
              { value: 'seated', label: 'Mostly seated' },
            ]}
            value={field.value}
            onChange={field.onChange}
          />
        )}
      />
      <TextField
        label="Something worn beneath that needs room?"
        hint="Optional and private: a binder, an orthosis, a bag, compression tights."
        autoComplete="off"
        error={errors.wornBeneath?.message}
        {...register('wornBeneath')}
      />
      {isSelf ? null : <ConsentFields form={form} />}
    </>
  );
}

function ConsentFields({ form: { register, formState } }: { form: UseFormReturn<WearerForm> }) {
  return (
    <fieldset className="grid gap-1 border-l-4 border-basting bg-paper px-4 py-3">
      <legend className="sr-only">What they agreed to</legend>
      <p className="font-bold">What did they agree to?</p>
      <p className="text-sm text-graphite">
        Another person’s body is theirs. Ask before each touch; nothing can be shared without the last of
        these.
      </p>
      <Tick label="To be measured" {...register('consentsMeasure')} />
      <Tick label="To be photographed" {...register('consentsPhotograph')} />
      <Tick label="That I show it to someone I name" {...register('consentsShare')} />
      <TextField
        type="date"
        label="On"
        error={formState.errors.consentOn?.message}
        {...register('consentOn', { setValueAs: (text: string | null) => text || null })}
      />
      <Tick label="They are under 18 (photos only by and with their guardian)" {...register('isUnder18')} />
    </fieldset>
  );
}
