'use client';
import { useSearchParams } from 'next/navigation';
import { Suspense } from 'react';
import { api } from '@/lib/api';
import { AccountForm } from '@/parts/account-form';

function Welcome() {
  const token = useSearchParams().get('token') ?? '';
  return (
    <AccountForm
      title="Become the owner"
      lead="This link works once. The account that you make here owns this server and its demo building."
      fields={[
        { name: 'name', label: 'Name', type: 'text', complete: 'name' },
        { name: 'email', label: 'E-mail', type: 'email', complete: 'username' },
        { name: 'password', label: 'Password, ten characters or more', type: 'password', complete: 'new-password' },
      ]}
      action="Make the account"
      submit={({ name = '', email = '', password = '' }) => api.becomeOwner({ token, name, email, password })}
    />
  );
}

export default function Page() {
  return (
    <Suspense>
      <Welcome />
    </Suspense>
  );
}
