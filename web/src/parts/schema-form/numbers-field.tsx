'use client';
import type { Units } from '@groundward/engine/building/definition';
import { faultSentence } from '@groundward/engine/building/fault';
import { useId } from 'react';
import { faultsAt, getAt, jsonPath, typedNumber, type Path } from '@/lib/edit';
import { helpOf, shapeOf, type SchemaNode } from '@/lib/schema';
import type { Editing } from '../edit-table';

/** Numbers, a point, or a list of points: one line a point, as it comes from a spreadsheet. */
export function NumbersField({
  node,
  path,
  title,
  units,
  editing,
}: {
  readonly node: SchemaNode;
  readonly path: Path;
  readonly title: string;
  readonly units: Units;
  readonly editing: Editing;
}) {
  const id = useId();
  const { help, unit } = helpOf(node, units);
  const value = getAt(editing.document, path);
  const text = textOf(node, value);
  const was = textOf(node, getAt(editing.saved, path));
  const faults = faultsAt(editing.faults, path);
  return (
    <div className={text === was ? 'schema-field' : 'schema-field changed'}>
      <label htmlFor={id}>{unit === undefined ? title : `${title} [${unit}]`}</label>
      <textarea
        key={text}
        id={id}
        aria-describedby={`${id}-help`}
        aria-invalid={faults.length > 0}
        data-path={jsonPath(path)}
        readOnly={editing.locked}
        rows={Math.min(8, Math.max(1, text.split('\n').length))}
        defaultValue={text}
        onBlur={(event) => {
          const typed = event.target.value.trim();
          if (editing.locked || typed === text) return;
          editing.onChange([{ path, value: typed === '' ? undefined : numbersOf(node, typed) }]);
        }}
      />
      <p id={`${id}-help`} className="help">
        {help}
      </p>
      {faults.map((fault) => (
        <div key={faultSentence(fault)} className="fault">
          {faultSentence(fault)}
        </div>
      ))}
    </div>
  );
}

/** Whether each line of the text is an entry of its own. */
function isRows(node: SchemaNode): boolean {
  const entry = node.items ?? node.prefixItems?.[0] ?? {};
  return shapeOf(entry) === 'tuple';
}

function textOf(node: SchemaNode, value: unknown): string {
  if (!Array.isArray(value)) return value === undefined ? '' : JSON.stringify(value);
  const rows: readonly unknown[] = value;
  if (!isRows(node)) return rows.map(String).join(' ');
  return rows.map((row) => (Array.isArray(row) ? row.map(String).join(' ') : String(row))).join('\n');
}

function numbersOf(node: SchemaNode, text: string): unknown {
  const line = (row: string): unknown[] =>
    row
      .trim()
      .split(/[\s;]+/)
      .map(typedNumber);
  return isRows(node)
    ? text
        .split('\n')
        .filter((row) => row.trim() !== '')
        .map(line)
    : line(text);
}
