'use client';
import type { Units } from '@groundward/engine/building/definition';
import { faultSentence } from '@groundward/engine/building/fault';
import { useId } from 'react';
import { faultsAt, getAt, jsonPath, shown, typedNumber, type Path } from '@/lib/edit';
import { choicesOf, helpOf, shapeOf, type SchemaNode } from '@/lib/schema';
import type { Editing } from '../edit-table';

/** One value of the building file: label, unit, field, its sentence of help, its faults. */
export function SchemaField({
  node,
  path,
  title,
  required,
  units,
  editing,
}: {
  readonly node: SchemaNode;
  readonly path: Path;
  readonly title: string;
  readonly required: boolean;
  readonly units: Units;
  readonly editing: Editing;
}) {
  const id = useId();
  const { help, unit } = helpOf(node, units);
  const text = shown(getAt(editing.document, path));
  const was = shown(getAt(editing.saved, path));
  const faults = faultsAt(editing.faults, path);
  const shape = shapeOf(node);
  const choices = shape === 'switch' ? ['true', 'false'] : choicesOf(node);
  const type = (typed: string): void =>
    editing.onChange([{ path, value: typed === '' ? undefined : valueOf(shape, typed) }]);
  const shared = {
    id,
    'aria-describedby': `${id}-help`,
    'aria-invalid': faults.length > 0,
    'aria-required': required,
    'data-path': jsonPath(path),
    title: text === was ? undefined : `saved: ${was === '' ? 'nothing' : was}`,
  } as const;
  return (
    <div className={text === was ? 'schema-field' : 'schema-field changed'}>
      <label htmlFor={id}>{unit === undefined ? title : `${title} [${unit}]`}</label>
      {shape === 'fixed' ? (
        <output id={id}>{String(node.const)}</output>
      ) : choices !== undefined ? (
        <select {...shared} disabled={editing.locked} value={text} onChange={(event) => type(event.target.value)}>
          {[...new Set([...(required && text !== '' ? [] : ['']), ...choices, text])].map((choice) => (
            <option key={choice} value={choice}>
              {choice === '' ? '–' : shape === 'switch' ? (choice === 'true' ? 'yes' : 'no') : choice}
            </option>
          ))}
        </select>
      ) : (
        <input
          {...shared}
          key={text}
          readOnly={editing.locked}
          defaultValue={text}
          inputMode={shape === 'number' ? 'decimal' : 'text'}
          onBlur={(event) => {
            if (!editing.locked && event.target.value.trim() !== text) type(event.target.value.trim());
          }}
          onKeyDown={(event) => event.key === 'Enter' && event.currentTarget.blur()}
        />
      )}
      <p id={`${id}-help`} className="help">
        {[help, required ? '' : help.toLowerCase().includes('default') ? '' : 'May be left out.']
          .filter(Boolean)
          .join(' ')}
      </p>
      {faults.map((fault) => (
        <div key={faultSentence(fault)} className="fault">
          {faultSentence(fault)}
        </div>
      ))}
    </div>
  );
}

function valueOf(shape: string, typed: string): unknown {
  if (shape === 'switch') return typed === 'true';
  return shape === 'number' ? typedNumber(typed) : typed;
}
