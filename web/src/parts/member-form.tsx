'use client';
import { getAt, jsonPath, type Path } from '@/lib/edit';
import { useQueryState } from '@/lib/query-state';
import { schemaAt, type SchemaNode } from '@/lib/schema';
import { partsOf } from './building-tables';
import type { Editing } from './edit-table';
import { SchemaForm } from './schema-form/schema-form';
import { Select } from './select';

type Member = { readonly name: string; readonly path: Path; readonly skip: readonly string[] };

/** Everything that the file can state about one level, floor, wall line, storey of a line or pier. */
export function MemberForm({ schema, editing }: { readonly schema: SchemaNode; readonly editing: Editing }) {
  const { units } = partsOf(editing.document);
  const kinds = membersOf(editing.document);
  const [wantedKind, setKind] = useQueryState('kind', 'Floors and roofs');
  const kind = kinds[wantedKind] === undefined ? 'Floors and roofs' : wantedKind;
  const members = kinds[kind] ?? [];
  const [wanted, setMember] = useQueryState('member', '');
  const member = members.find(({ name }) => name === wanted) ?? members[0];
  return (
    <>
      <div className="bar">
        <Select
          label="Kind"
          value={kind}
          options={Object.keys(kinds).map((value) => ({ value, name: value }))}
          onChange={setKind}
        />
        <Select
          label="Member"
          value={member?.name ?? ''}
          options={members.map(({ name }) => ({ value: name, name }))}
          onChange={setMember}
        />
      </div>
      {member === undefined ? (
        <p className="note">The building has none of these.</p>
      ) : (
        <SchemaForm
          key={jsonPath(member.path)}
          node={schemaAt(schema, member.path, editing.document)}
          path={member.path}
          title={member.name}
          required
          skip={member.skip}
          units={units}
          editing={editing}
        />
      )}
    </>
  );
}

function membersOf(document: unknown): Readonly<Record<string, readonly Member[]>> {
  const { levels, wallLines } = partsOf(document);
  const member = (name: string, path: Path, skip: readonly string[] = []): Member => ({ name, path, skip });
  return {
    Levels: levels.map(({ id }, l) => member(id, ['levels', l], ['diaphragms'])),
    'Floors and roofs': levels.flatMap(({ id, diaphragms }, l) =>
      (diaphragms ?? []).map((each, d) => member(`${id}/${each.id}`, ['levels', l, 'diaphragms', d])),
    ),
    'Wall lines': wallLines.map(({ id }, l) => member(id, ['wallLines', l], ['storeys'])),
    'Storeys of wall lines': wallLines.flatMap(({ id, storeys }, l) =>
      storeys.map(({ under }, s) => member(`${id}/${under}`, ['wallLines', l, 'storeys', s], ['piers'])),
    ),
    Piers: wallLines.flatMap(({ id, storeys }, l) =>
      storeys.flatMap(({ under, piers }, s) =>
        piers.map((pier, p) => member(`${id}/${under}/${pier.id}`, ['wallLines', l, 'storeys', s, 'piers', p])),
      ),
    ),
  };
}

/** The kind and the member in whose form a place of the file stands. */
export function memberAt(document: unknown, path: string): { kind: string; member: string } | undefined {
  let found: { kind: string; member: string; depth: number } | undefined;
  for (const [kind, members] of Object.entries(membersOf(document))) {
    for (const { name, path: own } of members) {
      const where = jsonPath(own);
      if (getAt(document, own) === undefined || (path !== where && !/^[.[]/.test(path.slice(where.length)))) continue;
      if (!path.startsWith(where) || (found !== undefined && found.depth >= own.length)) continue;
      found = { kind, member: name, depth: own.length };
    }
  }
  return found;
}
