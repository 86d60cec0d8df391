'use client';
import type { Fault } from '@groundward/engine/building/fault';
import { faultSentence } from '@groundward/engine/building/fault';
import type { ClipboardEvent, ReactNode } from 'react';
import { getAt, jsonPath, pastedCells, typedNumber, type Path } from '@/lib/edit';

export type EditColumn = {
  readonly head: string;
  readonly unit?: string;
  readonly key: Path;
  readonly text?: boolean;
  readonly choices?: readonly string[];
};

export type EditRow = {
  readonly key: string;
  readonly head: ReactNode;
  readonly path: Path;
  readonly actions?: ReactNode;
};

export type Change = { readonly path: Path; readonly value: unknown };

/** A table of the building file's own values. A block pasted from a spreadsheet fills the cells from the one that has the focus. */
export function EditTable({
  document,
  head,
  columns,
  rows,
  faults,
  locked,
  onChange,
}: {
  readonly document: unknown;
  readonly head: string;
  readonly columns: readonly EditColumn[];
  readonly rows: readonly EditRow[];
  readonly faults: readonly Fault[];
  readonly locked: boolean;
  readonly onChange: (changes: readonly Change[]) => void;
}) {
  const valueOf = (column: EditColumn, text: string): unknown =>
    column.text === true || column.choices !== undefined ? (text === '' ? undefined : text) : typedNumber(text);
  const paste = (event: ClipboardEvent, r: number, c: number): void => {
    const cells = pastedCells(event.clipboardData.getData('text/plain'));
    if (cells.length === 1 && cells[0]?.length === 1) return;
    event.preventDefault();
    onChange(
      cells.flatMap((line, i) =>
        line.flatMap((cell, j) => {
          const row = rows[r + i];
          const column = columns[c + j];
          return row === undefined || column === undefined
            ? []
            : [{ path: [...row.path, ...column.key], value: valueOf(column, cell.trim()) }];
        }),
      ),
    );
  };
  return (
    <div className="scroll">
      <table className="edit">
        <thead>
          <tr>
            <th>{head}</th>
            {columns.map((column) => (
              <th key={column.head}>
                {column.head}
                {column.unit !== undefined && <span style={{ fontWeight: 400 }}>{` [${column.unit}]`}</span>}
              </th>
            ))}
            <th aria-label="Actions" />
          </tr>
        </thead>
        <tbody>
          {rows.map((row, r) => (
            <tr key={row.key}>
              <td>{row.head}</td>
              {columns.map((column, c) => {
                const path = [...row.path, ...column.key];
                const value = getAt(document, path);
                const where = jsonPath(path);
                const fault = faults.find(
                  (candidate) =>
                    candidate.path === where ||
                    candidate.path.startsWith(`${where}[`) ||
                    candidate.path.startsWith(`${where}.`),
                );
                const text = shown(value);
                const label = `${column.head} of ${row.key}`;
                return (
                  <td key={column.head}>
                    {column.choices !== undefined ? (
                      <select
                        aria-label={label}
                        aria-invalid={fault !== undefined}
                        disabled={locked}
                        value={text}
                        onChange={(event) => onChange([{ path, value: valueOf(column, event.target.value) }])}
                      >
                        <option value="">–</option>
                        {column.choices.map((choice) => (
                          <option key={choice}>{choice}</option>
                        ))}
                      </select>
                    ) : (
                      <input
                        aria-label={label}
                        aria-invalid={fault !== undefined}
                        title={fault === undefined ? undefined : faultSentence(fault)}
                        className={column.text === true ? 'text' : undefined}
                        readOnly={locked}
                        defaultValue={text}
                        key={text}
                        inputMode={column.text === true ? 'text' : 'decimal'}
                        onPaste={(event) => !locked && paste(event, r, c)}
                        onBlur={(event) => {
                          if (!locked && event.target.value !== text)
                            onChange([{ path, value: valueOf(column, event.target.value) }]);
                        }}
                        onKeyDown={(event) => event.key === 'Enter' && event.currentTarget.blur()}
                      />
                    )}
                    {fault !== undefined && (
                      <div
                        style={{ color: 'var(--alarm)', fontSize: 11, maxWidth: 180, whiteSpace: 'normal' }}
                      >{`expected ${fault.expected}`}</div>
                    )}
                  </td>
                );
              })}
              <td>{row.actions}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

/** A value of the file as its cell shows it. */
function shown(value: unknown): string {
  if (value === undefined || value === null) return '';
  return typeof value === 'string' ? value : JSON.stringify(value);
}
