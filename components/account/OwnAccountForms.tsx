'use client';
import type { FormState } from '@/lib/request/action';
import { AccountForm, type AccountFieldSpec } from './AccountForm';
import { changeEmailSchema, changePasswordSchema, currentPasswordSchema } from './account-schema';

type Action = (before: FormState, form: FormData) => Promise<FormState>;

const CURRENT: AccountFieldSpec = {
  name: 'current',
  label: 'Your password now',
  type: 'password',
  autoComplete: 'current-password',
};

export function ChangePasswordForm({ action }: { action: Action }) {
  return (
    <AccountForm
      action={action}
      schema={changePasswordSchema}
      submit="Set the new password"
      fields={[
        CURRENT,
        {
          name: 'password',
          label: 'New password',
          type: 'password',
          autoComplete: 'new-password',
          hint: 'At least 10 characters.',
        },
      ]}
    />
  );
}

export function ChangeAddressForm({ action }: { action: Action }) {
  return (
    <AccountForm
      action={action}
      schema={changeEmailSchema}
      submit="Send the link"
      doneWords="If the address is free, a letter with a link is on its way to it. The link holds for 24 hours."
      fields={[CURRENT, { name: 'email', label: 'New e-mail address', type: 'email', autoComplete: 'email' }]}
    />
  );
}

export function CloseAccountForm({ action }: { action: Action }) {
  return (
    <AccountForm
      action={action}
      schema={currentPasswordSchema}
      submit="Close my account"
      fields={[CURRENT]}
    />
  );
}
