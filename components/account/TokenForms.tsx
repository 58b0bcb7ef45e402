'use client';
import type { FormState } from '@/lib/request/action';
import { AccountForm } from './AccountForm';
import { emailOnlySchema, resetSchema, tokenSchema } from './account-schema';

type Action = (before: FormState, form: FormData) => Promise<FormState>;

/** Opening the link does nothing by itself: scanners of mail open links too. */
export function ConfirmForm({ action, token }: { action: Action; token: string }) {
  return (
    <AccountForm
      action={action}
      schema={tokenSchema}
      hidden={{ token }}
      fields={[]}
      submit="Confirm my address"
    />
  );
}

export function ForgotForm({ action }: { action: Action }) {
  return (
    <AccountForm
      action={action}
      schema={emailOnlySchema}
      submit="Send me a link"
      fields={[{ name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'username' }]}
      doneWords="If there is an account with this address, a letter with a link is on its way. The link holds for 30 minutes."
    />
  );
}

export function ResetForm({ action, token }: { action: Action; token: string }) {
  return (
    <AccountForm
      action={action}
      schema={resetSchema}
      hidden={{ token }}
      submit="Set the new password"
      fields={[
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
