'use client';
import type { Building } from '@groundward/engine/building/definition';
import { EditTable, type Editing } from './edit-table';

/** While it is edited the document may be at fault; what can be shown of it is shown. */
export function partsOf(
  document: unknown,
): Pick<Building, 'levels' | 'wallLines' | 'loadCases' | 'units' | 'assemblies'> {
  const file = (document ?? {}) as Partial<Building>;
  return {
    levels: Array.isArray(file.levels) ? file.levels : [],
    wallLines: Array.isArray(file.wallLines) ? file.wallLines : [],
    loadCases: Array.isArray(file.loadCases) ? file.loadCases : [],
    units: file.units ?? { length: 'm', force: 'kN' },
    assemblies: file.assemblies,
  };
}

export function ForcesTable(props: Editing) {
  const { loadCases, levels, units } = partsOf(props.document);
  return (
    <div className="stack">
      {loadCases.map((loadCase, c) => (
        <section key={c} className="panel">
          <h2>{`${loadCase.id}${loadCase.name === undefined ? '' : `, ${loadCase.name}`}`}</h2>
          {loadCase.from === 'stated' ? (
            <EditTable
              {...props}
              label={`Forces of ${loadCase.id}`}
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
              extend={(count) => {
                const free = levels.slice(1).filter(({ id }) => !loadCase.forces.some((force) => force.level === id));
                const paths = free
                  .slice(0, count)
                  .map((_, i) => ['loadCases', c, 'forces', loadCase.forces.length + i]);
                return { paths, changes: paths.map((path, i) => ({ path, value: { level: free[i]?.id ?? '' } })) };
              }}
            />
          ) : (
            <p className="note">
              The forces of this case are computed from the basis of design and the weights; they stand on the pages of
              the levels.
            </p>
          )}
        </section>
      ))}
    </div>
  );
}

export function LevelsTable(props: Editing) {
  const { levels, units } = partsOf(props.document);
  return (
    <EditTable
      {...props}
      label="Levels"
      head="Level"
      columns={[
        { head: 'Name', key: ['name'], text: true },
        { head: 'Elevation', unit: units.length, key: ['elevation'] },
      ]}
      rows={levels.map((level, l) => ({ key: level.id, head: level.id, path: ['levels', l] }))}
    />
  );
}

export function WeightsTable(props: Editing) {
  const { levels, units, assemblies } = partsOf(props.document);
  const perArea = `${units.force}/${units.length}²`;
  const diaphragms = levels.flatMap((level, l) =>
    (level.diaphragms ?? []).map((diaphragm, d) => ({
      level,
      diaphragm,
      path: ['levels', l, 'diaphragms', d] as const,
    })),
  );
  const zones = diaphragms.flatMap(({ level, diaphragm, path }) =>
    (diaphragm.weight?.zones ?? []).map((zone, z) => ({
      key: `${level.id}/${zone.id}`,
      head: `${level.name ?? level.id}: ${zone.name ?? zone.id}`,
      path: [...path, 'weight', 'zones', z],
    })),
  );
  const lines = diaphragms.flatMap(({ level, diaphragm, path }) =>
    (diaphragm.weight?.lines ?? []).map((line, i) => ({
      key: `${level.id}/${line.id}`,
      head: `${level.name ?? level.id}: ${line.name ?? line.id}`,
      path: [...path, 'weight', 'lines', i],
    })),
  );
  return (
    <div className="stack">
      <section className="panel">
        <h2>Floors and roofs</h2>
        <EditTable
          {...props}
          label="Floors and roofs"
          head="Diaphragm"
          columns={[
            { head: 'Behaviour', key: ['behaviour'], choices: ['flexible', 'rigid', 'semi-rigid', 'envelope'] },
            { head: 'Area weight', unit: perArea, key: ['weight', 'area'] },
            { head: 'Assembly', key: ['assembly'], choices: (assemblies?.diaphragms ?? []).map(({ id }) => id) },
          ]}
          rows={diaphragms.map(({ level, diaphragm, path }) => ({
            key: `${level.id}/${diaphragm.id}`,
            head: diaphragm.name ?? `${level.id}/${diaphragm.id}`,
            path: [...path],
          }))}
        />
      </section>
      {zones.length > 0 && (
        <section className="panel">
          <h2>Zones, instead of the area weight inside their outline</h2>
          <EditTable
            {...props}
            label="Weight zones"
            head="Zone"
            columns={[{ head: 'Area weight', unit: perArea, key: ['area'] }]}
            rows={zones}
          />
        </section>
      )}
      {lines.length > 0 && (
        <section className="panel">
          <h2>Façades and partitions</h2>
          <EditTable
            {...props}
            label="Façades and partitions"
            head="Line"
            columns={[{ head: 'Weight', unit: `${units.force}/${units.length}`, key: ['perLength'] }]}
            rows={lines}
          />
        </section>
      )}
    </div>
  );
}

export function LinesTable(props: Editing) {
  const { wallLines, units } = partsOf(props.document);
  return (
    <EditTable
      {...props}
      label="Wall lines"
      head="Line"
      columns={[
        { head: 'Name', key: ['name'], text: true },
        { head: 'From x', unit: units.length, key: ['axis', 0, 0] },
        { head: 'From y', unit: units.length, key: ['axis', 0, 1] },
        { head: 'To x', unit: units.length, key: ['axis', 1, 0] },
        { head: 'To y', unit: units.length, key: ['axis', 1, 1] },
        { head: 'Piers share by', key: ['shareBy'], choices: ['length', 'stiffness', 'deflection'] },
      ]}
      rows={wallLines.map((line, l) => ({ key: line.id, head: line.id, path: ['wallLines', l] }))}
    />
  );
}
