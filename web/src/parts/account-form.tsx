'use client';
import { useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState, type SubmitEvent } from 'react';
import { placeAfter } from '@/lib/sign-in';
import { ProblemView } from './problem';

export type AccountField = {
  readonly name: string;
  readonly label: string;
  readonly type: 'text' | 'email' | 'password';
  readonly complete: string;
};

/** A form that ends signed in. */
export function AccountForm({
  title,
  lead,
  fields,
  action,
  submit,
}: {
  readonly title: string;
  readonly lead: string;
  readonly fields: readonly AccountField[];
  readonly action: string;
  readonly submit: (values: Record<string, string>) => Promise<unknown>;
}) {
  const [error, setError] = useState<unknown>(null);
  const [busy, setBusy] = useState(false);
  const router = useRouter();
  const client = useQueryClient();
  const send = async (event: SubmitEvent<HTMLFormElement>): Promise<void> => {
    event.preventDefault();
    const data = new FormData(event.currentTarget);
    setBusy(true);
    try {
      await submit(Object.fromEntries(fields.map(({ name }) => [name, textOf(data.get(name))])));
      await client.invalidateQueries();
      router.push(placeAfter(window.location.search));
    } catch (failure) {
      setError(failure);
      setBusy(false);
    }
  };
  return (
    <main>
      <form className="form" onSubmit={(event) => void send(event)}>
        <h1>{title}</h1>
        <p className="note">{lead}</p>
        {fields.map((field) => (
          <label key={field.name}>
            {field.label}
            <input
              name={field.name}
              type={field.type}
              autoComplete={field.complete}
              required
              minLength={field.type === 'password' && field.complete === 'new-password' ? 10 : 1}
            />
          </label>
        ))}
        <ProblemView error={error} />
        <div>
          <button className="primary" disabled={busy}>
            {action}
          </button>
        </div>
      </form>
    </main>
  );
}

function textOf(value: FormDataEntryValue | null): string {
  return typeof value === 'string' ? value : '';
}
