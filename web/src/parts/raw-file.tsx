'use client';
import { useState } from 'react';

/** The building file as text, where no table reaches. */
export function RawFile({
  document,
  locked,
  onReplace,
}: {
  readonly document: unknown;
  readonly locked: boolean;
  readonly onReplace: (document: unknown) => void;
}) {
  const [text, setText] = useState(() => JSON.stringify(document, null, 2));
  const [fault, setFault] = useState('');
  const take = (): void => {
    if (locked) return;
    try {
      const next: unknown = JSON.parse(text);
      setFault('');
      if (JSON.stringify(next) !== JSON.stringify(document)) onReplace(next);
    } catch (error) {
      setFault(`Not JSON yet: ${error instanceof Error ? error.message : String(error)}`);
    }
  };
  return (
    <section className="panel">
      <h2>The building file</h2>
      <textarea
        className="raw"
        spellCheck={false}
        aria-label="The building file"
        aria-invalid={fault !== ''}
        readOnly={locked}
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={take}
      />
      {fault !== '' && (
        <p className="problem" role="alert">
          {fault}
        </p>
      )}
    </section>
  );
}
