'use client';
import type { FormState } from '@/lib/request/action';
import { AccountForm } from './AccountForm';
import { signInSchema } from './account-schema';

interface Props {
  action: (before: FormState, form: FormData) => Promise<FormState>;
  next: string;
}

export function SignInForm({ action, next }: Props) {
  return (
    <AccountForm
      action={action}
      schema={signInSchema}
      hidden={{ next }}
      submit="Sign in"
      fields={[
        { name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'username' },
        { name: 'password', label: 'Password', type: 'password', autoComplete: 'current-password' },
      ]}
    />
  );
}
