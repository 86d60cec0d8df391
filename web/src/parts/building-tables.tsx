'use client';
import type { Building, Pier } from '@groundward/engine/building/definition';
import type { Fault } from '@groundward/engine/building/fault';
import { useState } from 'react';
import { EditTable, type Change, type EditColumn } from './edit-table';

export type TableProps = {
  readonly document: unknown;
  readonly faults: readonly Fault[];
  readonly locked: boolean;
  readonly onChange: (changes: readonly Change[]) => void;
};

/** While it is edited the document may be at fault; what can be shown of it is shown. */
function partsOf(document: unknown): Pick<Building, 'levels' | 'wallLines' | 'loadCases' | 'units' | 'assemblies'> {
  const file = document as Partial<Building>;
  return {
    levels: Array.isArray(file.levels) ? file.levels : [],
    wallLines: Array.isArray(file.wallLines) ? file.wallLines : [],
    loadCases: Array.isArray(file.loadCases) ? file.loadCases : [],
    units: file.units ?? { length: 'm', force: 'kN' },
    assemblies: file.assemblies,
  };
}

export function ForcesTable(props: TableProps) {
  const { loadCases, units } = partsOf(props.document);
  return (
    <div className="stack">
      {loadCases.map((loadCase, c) => (
        <section key={c} className="panel">
          <h2>{`${loadCase.id}${loadCase.name === undefined ? '' : `, ${loadCase.name}`}`}</h2>
          {loadCase.from === 'stated' ? (
            <EditTable
              {...props}
              head="Level"
              columns={[
                { head: 'Storey force', unit: units.force, key: ['force'] },
                { head: 'Diaphragm design force', unit: units.force, key: ['diaphragmForce'] },
              ]}
              rows={loadCase.forces.map((force, f) => ({
                key: `${loadCase.id} ${force.level}`,
                head: force.level,
                path: ['loadCases', c, 'forces', f],
              }))}
            />
          ) : (
            <p className="note">
              The forces of this case come from the basis of design and the weights; they stand on the level’s page.
            </p>
          )}
        </section>
      ))}
      <BasisTable {...props} />
    </div>
  );
}

const BASIS: readonly EditColumn[] = [
  { head: 'S_DS', key: ['SDS'] },
  { head: 'S_D1', key: ['SD1'] },
  { head: 'S_1', key: ['S1'] },
  { head: 'R', key: ['R'] },
  { head: 'Ω₀', key: ['overstrength'] },
  { head: 'C_d', key: ['Cd'] },
  { head: 'I_e', key: ['importance'] },
  { head: 'ρ', key: ['redundancy'] },
];

function BasisTable(props: TableProps) {
  const file = props.document as Partial<Building>;
  if (file.basis?.seismic === undefined) return null;
  return (
    <section className="panel">
      <h2>{`Seismic basis, ${file.basis.standard}`}</h2>
      <EditTable
        {...props}
        head=""
        columns={BASIS}
        rows={[{ key: 'basis', head: 'values', path: ['basis', 'seismic'] }]}
      />
    </section>
  );
}

export function WeightsTable(props: TableProps) {
  const { levels, units } = partsOf(props.document);
  const perArea = `${units.force}/${units.length}²`;
  const perLength = `${units.force}/${units.length}`;
  const diaphragms = levels.flatMap((level, l) =>
    (level.diaphragms ?? []).map((diaphragm, d) => ({
      level,
      diaphragm,
      path: ['levels', l, 'diaphragms', d] as const,
    })),
  );
  return (
    <div className="stack">
      <section className="panel">
        <h2>Floors and roofs</h2>
        <EditTable
          {...props}
          head="Diaphragm"
          columns={[
            { head: 'Behaviour', key: ['behaviour'], choices: ['flexible', 'rigid', 'semi-rigid'] },
            { head: 'Area weight', unit: perArea, key: ['weight', 'area'] },
          ]}
          rows={diaphragms.map(({ level, diaphragm, path }) => ({
            key: `${level.id}/${diaphragm.id}`,
            head: diaphragm.name ?? `${level.id}/${diaphragm.id}`,
            path: [...path],
          }))}
        />
      </section>
      <section className="panel">
        <h2>Zones</h2>
        <EditTable
          {...props}
          head="Zone"
          columns={[{ head: 'Area weight', unit: perArea, key: ['area'] }]}
          rows={diaphragms.flatMap(({ level, diaphragm, path }) =>
            (diaphragm.weight?.zones ?? []).map((zone, z) => ({
              key: `${level.id}/${zone.id}`,
              head: `${level.name ?? level.id}: ${zone.name ?? zone.id}`,
              path: [...path, 'weight', 'zones', z],
            })),
          )}
        />
      </section>
      <section className="panel">
        <h2>Façades and partitions</h2>
        <EditTable
          {...props}
          head="Line"
          columns={[{ head: 'Weight', unit: perLength, key: ['perLength'] }]}
          rows={diaphragms.flatMap(({ level, diaphragm, path }) =>
            (diaphragm.weight?.lines ?? []).map((line, i) => ({
              key: `${level.id}/${line.id}`,
              head: `${level.name ?? level.id}: ${line.name ?? line.id}`,
              path: [...path, 'weight', 'lines', i],
            })),
          )}
        />
      </section>
    </div>
  );
}

export function LinesTable(props: TableProps) {
  const { wallLines, units } = partsOf(props.document);
  return (
    <EditTable
      {...props}
      head="Line"
      columns={[
        { head: 'Name', key: ['name'], text: true },
        { head: 'from x', unit: units.length, key: ['axis', 0, 0] },
        { head: 'from y', unit: units.length, key: ['axis', 0, 1] },
        { head: 'to x', unit: units.length, key: ['axis', 1, 0] },
        { head: 'to y', unit: units.length, key: ['axis', 1, 1] },
        { head: 'Piers share by', key: ['shareBy'], choices: ['length', 'stiffness'] },
      ]}
      rows={wallLines.map((line, l) => ({ key: line.id, head: line.id, path: ['wallLines', l] }))}
    />
  );
}

export function PiersTable(props: TableProps) {
  const { wallLines, units, assemblies } = partsOf(props.document);
  const [only, setOnly] = useState(wallLines[0]?.id ?? '');
  const columns: readonly EditColumn[] = [
    { head: 'From', unit: units.length, key: ['from'] },
    { head: 'To', unit: units.length, key: ['to'] },
    { head: 'Assembly', key: ['assembly'], choices: (assemblies?.walls ?? []).map((wall) => wall.id) },
    { head: 'Stiffness', unit: `${units.force}/${units.length}`, key: ['stiffness'] },
    { head: 'Post offset', unit: units.length, key: ['endOffset'] },
    { head: 'Dead', unit: `${units.force}/${units.length}`, key: ['gravity', 0, 'perLength'] },
  ];
  const gravityOf = (pier: Pier): string => (pier.gravity ?? []).map((load) => load.case).join(', ');
  return (
    <>
      <div className="bar">
        <label>
          Wall line
          <select value={only} onChange={(event) => setOnly(event.target.value)}>
            <option value="">all</option>
            {wallLines.map((line) => (
              <option key={line.id} value={line.id}>
                {line.name ?? line.id}
              </option>
            ))}
          </select>
        </label>
      </div>
      <EditTable
        {...props}
        head="Pier"
        columns={columns}
        rows={wallLines.flatMap((line, l) =>
          only !== '' && line.id !== only
            ? []
            : line.storeys.flatMap((storey, s) =>
                storey.piers.map((pier, p) => ({
                  key: `${line.id}/${storey.under}/${pier.id}`,
                  head: `${line.id}/${storey.under}/${pier.id}`,
                  path: ['wallLines', l, 'storeys', s, 'piers', p],
                  actions: props.locked ? (
                    <span className="note">{gravityOf(pier)}</span>
                  ) : (
                    <>
                      <button
                        className="quiet"
                        onClick={() =>
                          props.onChange([
                            {
                              path: ['wallLines', l, 'storeys', s, 'piers'],
                              value: [...storey.piers, following(storey.piers, pier)],
                            },
                          ])
                        }
                      >
                        Add beside
                      </button>
                      {storey.piers.length > 1 && (
                        <button
                          className="quiet"
                          onClick={() =>
                            props.onChange([
                              {
                                path: ['wallLines', l, 'storeys', s, 'piers'],
                                value: storey.piers.filter((other) => other !== pier),
                              },
                            ])
                          }
                        >
                          Remove
                        </button>
                      )}
                    </>
                  ),
                })),
              ),
        )}
      />
    </>
  );
}

/** A pier as long as its neighbour, just beyond the last one, with an id that is free. */
function following(piers: readonly Pier[], like: Pier): Pier {
  const end = Math.max(...piers.map((pier) => pier.to));
  let n = piers.length + 1;
  while (piers.some((pier) => pier.id === `p${n}`)) n += 1;
  return { ...like, id: `p${n}`, from: end, to: end + (like.to - like.from) };
}

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
  return (
    <section className="panel">
      <h2>The building file</h2>
      <textarea
        className="raw"
        spellCheck={false}
        aria-label="The building file"
        readOnly={locked}
        value={text}
        onChange={(event) => setText(event.target.value)}
        onBlur={() => {
          if (locked) return;
          try {
            const next: unknown = JSON.parse(text);
            setFault('');
            if (JSON.stringify(next) !== JSON.stringify(document)) onReplace(next);
          } catch (error) {
            setFault(`Not JSON yet: ${error instanceof Error ? error.message : String(error)}`);
          }
        }}
      />
      {fault !== '' && <p className="problem">{fault}</p>}
    </section>
  );
}
