'use client';
import type { SchemaNode } from '@/lib/schema';
import { titleOf } from '@/lib/schema';
import { partsOf } from './building-tables';
import type { Editing } from './edit-table';
import { SchemaForm } from './schema-form/schema-form';

/** What the tables and the plan hold; all else that a building file may state is in these forms. */
const ELSEWHERE = ['schema', 'levels', 'wallLines'];
const ASSEMBLIES = ['assemblies'];

/** Parts of the building file that are neither plan nor walls: basis of design, load cases, combinations and the like. */
export function BasisForm({ schema, editing }: { readonly schema: SchemaNode; readonly editing: Editing }) {
  const keys = Object.keys(schema.properties ?? {}).filter((key) => ![...ELSEWHERE, ...ASSEMBLIES].includes(key));
  return <Parts schema={schema} editing={editing} keys={keys} />;
}

export function AssembliesForm({ schema, editing }: { readonly schema: SchemaNode; readonly editing: Editing }) {
  return <Parts schema={schema} editing={editing} keys={ASSEMBLIES} />;
}

function Parts({
  schema,
  editing,
  keys,
}: {
  readonly schema: SchemaNode;
  readonly editing: Editing;
  readonly keys: readonly string[];
}) {
  const { units } = partsOf(editing.document);
  return (
    <div className="stack">
      {keys.map((key) => (
        <section key={key} className="panel">
          <SchemaForm
            node={schema.properties?.[key] ?? {}}
            path={[key]}
            title={titleOf(key)}
            required={schema.required?.includes(key) ?? false}
            units={units}
            editing={editing}
          />
        </section>
      ))}
    </div>
  );
}
