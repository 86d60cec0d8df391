'use client';
import type { Fault } from '@groundward/engine/building/fault';
import { faultSentence } from '@groundward/engine/building/fault';
import type { ClipboardEvent, ReactNode } from 'react';
import { faultsAt, getAt, jsonPath, pastedCells, shown, typedNumber, type Change, type Path } from '@/lib/edit';
import { EditCell } from './edit-cell';
import { Table } from './table';

export type EditColumn = {
  readonly head: string;
  readonly unit?: string;
  readonly key: Path;
  readonly text?: boolean;
  readonly choices?: readonly string[];
  /** Where a cell is not simply the value at `key`: how it is read from the row, and put back into it. */
  readonly read?: (row: unknown) => unknown;
  readonly write?: (row: unknown, typed: string) => unknown;
};

export type EditRow = {
  readonly key: string;
  readonly head: ReactNode;
  readonly path: Path;
  readonly actions?: ReactNode;
};

/** What an editing table needs of the editor that it stands in. */
export type Editing = {
  readonly document: unknown;
  /** The building as last saved: cells that differ from it are marked. */
  readonly saved: unknown;
  readonly faults: readonly Fault[];
  readonly locked: boolean;
  readonly onChange: (changes: readonly Change[]) => void;
};

/**
 * A table of the building file's own values. A block pasted from a spreadsheet fills the cells from the one that has the focus; where
 * it is longer than the table, `extend` makes the rows that it needs.
 */
export function EditTable({
  label,
  head,
  columns,
  rows,
  extend,
  document,
  saved,
  faults,
  locked,
  onChange,
}: Editing & {
  readonly label: string;
  readonly head: string;
  readonly columns: readonly EditColumn[];
  readonly rows: readonly EditRow[];
  readonly extend?: (count: number) => { readonly paths: readonly Path[]; readonly changes: readonly Change[] };
}) {
  const paste = (event: ClipboardEvent, r: number, c: number): void => {
    const cells = pastedCells(event.clipboardData.getData('text/plain'));
    if (cells.length === 1 && cells[0]?.length === 1) return;
    event.preventDefault();
    const missing = Math.max(0, r + cells.length - rows.length);
    const more = missing === 0 ? undefined : extend?.(missing);
    const paths = [...rows.map(({ path }) => path), ...(more?.paths ?? [])];
    onChange([
      ...(more?.changes ?? []),
      ...cells.flatMap((line, i) =>
        line.flatMap((cell, j): Change[] => {
          const [path, column] = [paths[r + i], columns[c + j]];
          return path === undefined || column === undefined ? [] : [changeOf(column, path, cell.trim())];
        }),
      ),
    ]);
  };
  return (
    <Table label={label} className="edit">
      <thead>
        <tr>
          <th>{head}</th>
          {columns.map((column) => (
            <th key={column.head}>{column.unit === undefined ? column.head : `${column.head} [${column.unit}]`}</th>
          ))}
          <th aria-label="Actions" />
        </tr>
      </thead>
      <tbody>
        {rows.map((row, r) => (
          <tr key={row.key}>
            <th scope="row">
              {row.head}
              {faults
                .filter(({ path }) => path === jsonPath(row.path))
                .map((fault) => (
                  <div key={faultSentence(fault)} className="fault">
                    {faultSentence(fault)}
                  </div>
                ))}
            </th>
            {columns.map((column, c) => {
              const path = [...row.path, ...column.key];
              return (
                <EditCell
                  key={column.head}
                  label={`${column.head} of ${row.key}`}
                  where={jsonPath(path)}
                  text={textOf(column, document, row.path)}
                  was={textOf(column, saved, row.path)}
                  faults={faultsAt(faults, path)}
                  locked={locked}
                  wide={column.text === true}
                  choices={column.choices}
                  onType={(typed) => onChange([changeOf(column, row.path, typed)])}
                  onPaste={(event) => paste(event, r, c)}
                />
              );
            })}
            <td>{row.actions}</td>
          </tr>
        ))}
      </tbody>
    </Table>
  );
}

function textOf(column: EditColumn, document: unknown, path: Path): string {
  const row = getAt(document, path);
  return shown(column.read === undefined ? getAt(row, column.key) : column.read(row));
}

/** A change of one cell. One that is put back into its row is worked out when it is applied, so that two on one row both count. */
function changeOf(column: EditColumn, path: Path, typed: string): Change {
  const { write } = column;
  if (write !== undefined) return { path, value: (row: unknown) => write(row, typed) };
  const value =
    column.text === true || column.choices !== undefined ? (typed === '' ? undefined : typed) : typedNumber(typed);
  return { path: [...path, ...column.key], value };
}
