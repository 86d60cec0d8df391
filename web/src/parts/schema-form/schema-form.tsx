'use client';
import type { Units } from '@groundward/engine/building/definition';
import { faultSentence } from '@groundward/engine/building/fault';
import { useId } from 'react';
import { getAt, jsonPath, type Path } from '@/lib/edit';
import {
  asVariant,
  blank,
  choicesOf,
  helpOf,
  isPlain,
  shapeOf,
  titleOf,
  variantName,
  variantOf,
  variantsOf,
  type SchemaNode,
} from '@/lib/schema';
import { EditTable, type EditColumn, type Editing } from '../edit-table';
import { NumbersField } from './numbers-field';
import { SchemaField } from './schema-field';

type Props = {
  /** Whether the title stands already where the form stands. */
  readonly bare?: boolean;
  readonly node: SchemaNode;
  readonly path: Path;
  readonly title: string;
  readonly required: boolean;
  readonly units: Units;
  readonly editing: Editing;
};

/**
 * A form for any part of the building file, made from its JSON Schema: what the definition gains, the form gains with it. `skip` names
 * keys that have a table of their own.
 */
export function SchemaForm(props: Props & { readonly skip?: readonly string[] }) {
  const { node, path, editing } = props;
  const value = getAt(editing.document, path);
  if (isPlain(node)) return <SchemaField {...props} />;
  if (value === undefined) return <Absent {...props} />;
  switch (shapeOf(node)) {
    case 'union':
      return <UnionForm {...props} />;
    case 'tuple':
      return <NumbersField {...props} />;
    case 'list':
      return isNumbers(node.items ?? {}) ? <NumbersField {...props} /> : <ListForm {...props} />;
    default:
      return <ObjectForm {...props} />;
  }
}

/** A number, a point, or a list of such: put in as lines of numbers. */
function isNumbers(node: SchemaNode): boolean {
  const shape = shapeOf(node);
  return shape === 'number' || (shape === 'tuple' && (node.prefixItems ?? []).every(isNumbers));
}

function Absent({ node, path, title, units, editing }: Props) {
  return (
    <div className="schema-absent">
      <button
        className="quiet"
        disabled={editing.locked}
        data-path={jsonPath(path)}
        onClick={() => editing.onChange([{ path, value: blank(node) }])}
      >
        {`State ${lower(title)}`}
      </button>{' '}
      <span className="help">{helpOf(node, units).help}</span>
      <Faults {...{ editing, path }} />
    </div>
  );
}

function ObjectForm({
  node,
  path,
  title,
  required,
  units,
  editing,
  bare = false,
  skip = [],
}: Props & { readonly skip?: readonly string[] }) {
  const entries = Object.entries(node.properties ?? {}).filter(([key]) => !skip.includes(key));
  const part = ([key, property]: readonly [string, SchemaNode]) => (
    <SchemaForm
      key={key}
      node={property}
      path={[...path, key]}
      title={titleOf(key)}
      required={node.required?.includes(key) ?? false}
      units={units}
      editing={editing}
    />
  );
  const plain = entries.filter(([, property]) => isPlain(property));
  const deep = entries.filter(([, property]) => !isPlain(property));
  return (
    <fieldset className="schema" aria-label={title}>
      {!bare && (
        <legend>
          {title} <LeaveOut {...{ path, title, required, editing }} />
        </legend>
      )}
      {node.description !== undefined && <p className="help">{helpOf(node, units).help}</p>}
      <Faults {...{ editing, path }} />
      {plain.length > 0 && <div className="schema-fields">{plain.map(part)}</div>}
      {deep.map(part)}
    </fieldset>
  );
}

function UnionForm(props: Props & { readonly skip?: readonly string[] }) {
  const { node, path, title, required, editing } = props;
  const id = useId();
  const value = getAt(editing.document, path);
  const variants = variantsOf(node);
  const index = variantOf(node, value);
  return (
    <div className="schema-union">
      <div className="field">
        <label htmlFor={id}>{`${title}: form`}</label>
        <select
          id={id}
          disabled={editing.locked}
          value={index}
          onChange={(event) => {
            const next = variants[Number(event.target.value)] ?? {};
            editing.onChange([{ path, value: (old: unknown) => asVariant(next, old) }]);
          }}
        >
          {variants.map((variant, i) => (
            <option key={i} value={i}>
              {variantName(variant)}
            </option>
          ))}
        </select>
        <LeaveOut {...{ path, title, required, editing }} />
      </div>
      <SchemaForm {...props} node={variants[index] ?? {}} required bare />
    </div>
  );
}

function ListForm(props: Props) {
  const { node, path, title, required, units, editing } = props;
  const items = node.items ?? {};
  const value = getAt(editing.document, path);
  const rows: readonly unknown[] = Array.isArray(value) ? value : [];
  return (
    <fieldset className="schema" aria-label={title}>
      <legend>
        {title} <LeaveOut {...{ path, title, required, editing }} />
      </legend>
      {node.description !== undefined && <p className="help">{helpOf(node, units).help}</p>}
      <Faults {...{ editing, path }} />
      {isRow(items) ? (
        <RowTable {...props} rows={rows} />
      ) : (
        rows.map((row, i) => (
          <details key={i} className="schema-row" open={rows.length <= 4}>
            <summary>{nameOf(row, i)}</summary>
            <SchemaForm
              node={items}
              path={[...path, i]}
              title={nameOf(row, i)}
              required
              bare
              units={units}
              editing={editing}
            />
            {!editing.locked && <Remove {...{ path, rows, editing }} at={i} />}
          </details>
        ))
      )}
      {!editing.locked && (
        <button onClick={() => editing.onChange([{ path: [...path, rows.length], value: blank(items) ?? '' }])}>
          {`Add to ${lower(title)}`}
        </button>
      )}
    </fieldset>
  );
}

/** Whether an entry of a list is a row of plain values. */
function isRow(node: SchemaNode): boolean {
  return shapeOf(node) === 'object' && Object.values(node.properties ?? {}).every(isPlain);
}

function RowTable({ node, path, title, units, editing, rows }: Props & { readonly rows: readonly unknown[] }) {
  const columns = Object.entries(node.items?.properties ?? {}).map(([key, property]): EditColumn => {
    const { unit } = helpOf(property, units);
    const choices = choicesOf(property);
    const head = titleOf(key);
    return {
      head,
      key: [key],
      text: shapeOf(property) === 'text',
      ...(unit === undefined ? {} : { unit }),
      ...(choices === undefined ? {} : { choices }),
    };
  });
  return (
    <EditTable
      {...editing}
      label={title}
      head=""
      columns={columns}
      rows={rows.map((row, i) => ({
        key: `${title} ${nameOf(row, i)}`,
        head: String(i + 1),
        path: [...path, i],
        actions: editing.locked ? undefined : <Remove {...{ path, rows, editing }} at={i} />,
      }))}
    />
  );
}

function Remove({
  path,
  rows,
  editing,
  at,
}: Pick<Props, 'path' | 'editing'> & { readonly rows: readonly unknown[]; readonly at: number }) {
  return (
    <button
      className="quiet"
      onClick={() => editing.onChange([{ path, value: rows.filter((_, other) => other !== at) }])}
    >
      {`Remove ${nameOf(rows[at], at)}`}
    </button>
  );
}

function LeaveOut({ path, title, required, editing }: Pick<Props, 'path' | 'title' | 'required' | 'editing'>) {
  if (required || editing.locked) return null;
  return (
    <button className="quiet" onClick={() => editing.onChange([{ path, value: undefined }])}>
      {`Leave out ${lower(title)}`}
    </button>
  );
}

/** Faults of the value itself; those of what is in it stand at its fields. */
function Faults({ editing, path }: Pick<Props, 'editing' | 'path'>) {
  const where = jsonPath(path);
  return editing.faults
    .filter((fault) => fault.path === where)
    .map((fault) => (
      <div key={faultSentence(fault)} className="fault">
        {faultSentence(fault)}
      </div>
    ));
}

function nameOf(row: unknown, index: number): string {
  const { id, level, case: loadCase } = (row ?? {}) as Readonly<Record<string, unknown>>;
  const known = [id, level, loadCase].find((name) => typeof name === 'string' && name !== '');
  return typeof known === 'string' ? known : `no. ${index + 1}`;
}

function lower(title: string): string {
  return /^[A-Z][a-z]/.test(title) ? title.charAt(0).toLowerCase() + title.slice(1) : title;
}
