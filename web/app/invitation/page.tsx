'use client';
import { useSearchParams } from 'next/navigation';
import { Suspense } from 'react';
import { api } from '@/lib/api';
import { AccountForm } from '@/parts/account-form';

function Invitation() {
  const token = useSearchParams().get('token') ?? '';
  return (
    <AccountForm
      title="Accept the invitation"
      lead="The link works once and is tied to the e-mail address for which it was made."
      fields={[
        { name: 'name', label: 'Name', type: 'text', complete: 'name' },
        { name: 'password', label: 'Password, ten characters or more', type: 'password', complete: 'new-password' },
      ]}
      action="Make the account"
      submit={({ name = '', password = '' }) => api.acceptInvitation({ token, name, password })}
    />
  );
}

export default function Page() {
  return (
    <Suspense>
      <Invitation />
    </Suspense>
  );
}
