'use client';
import { api } from '@/lib/api';
import { AccountForm } from '@/parts/account-form';

export default function SignIn() {
  return (
    <AccountForm
      title="Sign in"
      lead="Accounts are made by an owner’s link or an invitation."
      fields={[
        { name: 'email', label: 'E-mail', type: 'email', complete: 'username' },
        { name: 'password', label: 'Password', type: 'password', complete: 'current-password' },
      ]}
      action="Sign in"
      submit={({ email = '', password = '' }) => api.signIn(email, password)}
    />
  );
}
