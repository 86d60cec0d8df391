'use client';
import type { GravityCase, Pier, WallLine } from '@groundward/engine/building/definition';
import { typedNumber, type Change, type Path } from '@/lib/edit';
import { useQueryState } from '@/lib/query-state';
import { partsOf } from './building-tables';
import { EditTable, type EditColumn, type Editing, type EditRow } from './edit-table';
import { Select } from './select';

const ALL = 'all';

/** Piers of one wall line, or of all, storey by storey. */
export function PiersTable(props: Editing) {
  const { wallLines, units, assemblies } = partsOf(props.document);
  const [wanted, setOnly] = useQueryState('line', wallLines[0]?.id ?? ALL);
  const only = wallLines.some(({ id }) => id === wanted) ? wanted : ALL;
  const perLength = `${units.force}/${units.length}`;
  const columns: readonly EditColumn[] = [
    { head: 'From', unit: units.length, key: ['from'] },
    { head: 'To', unit: units.length, key: ['to'] },
    { head: 'Assembly', key: ['assembly'], choices: (assemblies?.walls ?? []).map(({ id }) => id) },
    { head: 'Hold-down', key: ['holdDown'], choices: (assemblies?.holdDowns ?? []).map(({ id }) => id) },
    { head: 'Stiffness', unit: perLength, key: ['stiffness'] },
    { head: 'Post offset', unit: units.length, key: ['endOffset'], read: readOffset, write: writeOffset },
    ...(['D', 'L', 'S'] as const).map((gravity): EditColumn => ({
      head: gravity,
      unit: perLength,
      key: ['gravity'],
      read: (row) => gravityOf(row).find((load) => load.case === gravity)?.perLength,
      write: (row, typed) => withGravity(row, gravity, typed),
    })),
  ];
  const rows = wallLines.flatMap((line, l) =>
    only === ALL || line.id === only ? rowsOf(line, ['wallLines', l], props) : [],
  );
  return (
    <>
      <div className="bar">
        <Select
          label="Wall line"
          value={only}
          options={[{ value: ALL, name: 'all' }, ...wallLines.map(({ id, name }) => ({ value: id, name: name ?? id }))]}
          onChange={setOnly}
        />
        <span className="note">
          D, L, S: dead, live and snow load on top of the pier. A post offset may be two numbers, near / far.
        </span>
      </div>
      <EditTable
        {...props}
        label="Piers"
        head="Pier"
        columns={columns}
        rows={rows}
        extend={(count) => extended(wallLines, rows, count)}
      />
    </>
  );
}

function rowsOf(line: WallLine, path: Path, { locked, onChange }: Editing): EditRow[] {
  return line.storeys.flatMap(({ under, piers }, s) => {
    const at = [...path, 'storeys', s, 'piers'];
    return piers.map((pier, p): EditRow => {
      const key = `${line.id}/${under}/${pier.id}`;
      return {
        key,
        head: key,
        path: [...at, p],
        actions: locked ? undefined : (
          <>
            <button
              className="quiet"
              aria-label={`Add a pier beside ${key}`}
              onClick={() => onChange([{ path: at, value: [...piers, following(piers, pier, 0)] }])}
            >
              add
            </button>
            {piers.length > 1 && (
              <button
                className="quiet"
                aria-label={`Remove ${key}`}
                onClick={() => onChange([{ path: at, value: piers.filter((other) => other !== pier) }])}
              >
                remove
              </button>
            )}
          </>
        ),
      };
    });
  });
}

/** Rows that a longer block needs: piers beside the last one that is shown. */
function extended(
  wallLines: readonly WallLine[],
  rows: readonly EditRow[],
  count: number,
): { paths: Path[]; changes: Change[] } {
  const [, l, , s] = rows[rows.length - 1]?.path ?? [];
  const piers = wallLines[Number(l)]?.storeys[Number(s)]?.piers ?? [];
  const last = piers[piers.length - 1];
  if (l === undefined || s === undefined || last === undefined) return { paths: [], changes: [] };
  const paths = Array.from({ length: count }, (_, i): Path => [
    'wallLines',
    l,
    'storeys',
    s,
    'piers',
    piers.length + i,
  ]);
  return { paths, changes: paths.map((path, i) => ({ path, value: following(piers, last, i) })) };
}

/** A pier as long as its neighbour, beyond the last one, with an id that is free. */
function following(piers: readonly Pier[], like: Pier, after: number): Pier {
  const length = like.to - like.from;
  const from = Math.max(...piers.map(({ to }) => to)) + after * length;
  const free = Array.from({ length: piers.length + after + 1 }, (_, i) => `p${piers.length + i + 1}`).filter(
    (id) => !piers.some((pier) => pier.id === id),
  );
  return { ...like, id: free[after] ?? `p${piers.length + after + 1}`, from, to: from + length };
}

function readOffset(row: unknown): unknown {
  const offset = (row as Pier | undefined)?.endOffset;
  return Array.isArray(offset) ? offset.join(' / ') : offset;
}

function writeOffset(row: unknown, typed: string): unknown {
  const { endOffset: _, ...rest } = row as Pier;
  const parts = typed.split('/').map(typedNumber);
  const value = parts.length > 1 ? parts : parts[0];
  return value === undefined ? rest : { ...rest, endOffset: value };
}

function gravityOf(row: unknown): NonNullable<Pier['gravity']> {
  return (row as Pier | undefined)?.gravity ?? [];
}

function withGravity(row: unknown, gravity: GravityCase, typed: string): unknown {
  const { gravity: _, ...rest } = row as Pier;
  const perLength = typedNumber(typed);
  const loads: unknown[] = gravityOf(row).filter((load) => load.case !== gravity);
  if (perLength !== undefined) loads.push({ case: gravity, perLength });
  return loads.length === 0 ? rest : { ...rest, gravity: loads };
}
