'use client';
import type { FormState } from '@/lib/request/action';
import { AccountForm } from './AccountForm';
import { signUpSchema } from './account-schema';

type Action = (before: FormState, form: FormData) => Promise<FormState>;

export function SignUpForm({ action }: { action: Action }) {
  return (
    <AccountForm
      action={action}
      schema={signUpSchema}
      submit="Make an account"
      fields={[
        {
          name: 'displayName',
          label: 'Your name here',
          type: 'text',
          autoComplete: 'nickname',
          hint: 'Initials or a made-up name will do.',
        },
        { name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'username' },
        {
          name: 'password',
          label: 'Password',
          type: 'password',
          autoComplete: 'new-password',
          hint: 'At least 10 characters.',
        },
      ]}
      doneWords="Look into your mail: a letter with a link is on its way. Open it and confirm your address."
    />
  );
}
