'use client';
import { useState } from 'react';
import type { Revision } from '@/lib/api';

/** From then on the revision never changes: said before it happens. */
export function IssueForm({
  revision,
  onIssue,
  onCancel,
}: {
  readonly revision: Revision;
  readonly onIssue: (body: { purpose: string; remarks?: string }) => void;
  readonly onCancel: () => void;
}) {
  const [purpose, setPurpose] = useState('');
  const [remarks, setRemarks] = useState(revision.remarks ?? '');
  return (
    <form
      className="form panel"
      onSubmit={(event) => {
        event.preventDefault();
        onIssue(remarks === '' ? { purpose } : { purpose, remarks });
      }}
    >
      <h2>{`Issue revision ${revision.number}, ${revision.name}`}</h2>
      <p className="note">An issued revision never changes again; the database itself keeps it.</p>
      <label>
        Purpose
        <input value={purpose} onChange={(event) => setPurpose(event.target.value)} required maxLength={500} />
      </label>
      <label>
        Remarks
        <textarea rows={3} value={remarks} onChange={(event) => setRemarks(event.target.value)} maxLength={5000} />
      </label>
      <div className="bar">
        <button className="primary">Issue it</button>
        <button type="button" onClick={onCancel}>
          Not yet
        </button>
      </div>
    </form>
  );
}
