'use client';
import { useState } from 'react';
import type { Revision } from '@/lib/api';

/** A draft's other name. */
export function NameForm({
  revision,
  onName,
  onCancel,
}: {
  readonly revision: Revision;
  readonly onName: (name: string) => void;
  readonly onCancel: () => void;
}) {
  const [name, setName] = useState(revision.name);
  return (
    <form
      className="form panel"
      onSubmit={(event) => {
        event.preventDefault();
        onName(name);
      }}
    >
      <h2>{`Rename revision ${revision.number}`}</h2>
      <label>
        Name
        <input value={name} onChange={(event) => setName(event.target.value)} required maxLength={200} autoFocus />
      </label>
      <div className="bar">
        <button className="primary">Rename it</button>
        <button type="button" onClick={onCancel}>
          Leave it
        </button>
      </div>
    </form>
  );
}
