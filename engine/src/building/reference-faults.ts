/** Faults between the parts of a file: identities, references, elevations. */
import { GravityCase, type Building, type Combination } from './definition.js';
import { basisFaults } from './basis-faults.js';
import { combinedFaults } from './combined-faults.js';
import type { Fault } from './fault.js';

/** The parts of a file whose shape is right, each at its place. */
export type Parts = {
  readonly levels: readonly (Building['levels'][number] | undefined)[];
  readonly wallLines: readonly (Building['wallLines'][number] | undefined)[];
  readonly loadCases: readonly (Building['loadCases'][number] | undefined)[];
  readonly assemblies?: Building['assemblies'];
  readonly basis?: Building['basis'];
  readonly bases?: readonly (NonNullable<Building['bases']>[number] | undefined)[] | undefined;
  readonly combinations?: Building['combinations'];
  /** Whether every level could be read: references to levels are judged only then. */
  readonly levelsComplete: boolean;
};

export function referenceFaults(parts: Parts): Fault[] {
  return [
    ...identityFaults(parts),
    ...elevationFaults(parts),
    ...levelReferences(parts),
    ...assemblyReferences(parts),
    ...loadFaults(parts),
    ...basisFaults(parts),
    ...combinedFaults(parts.loadCases),
  ];
}

function duplicates(items: readonly ({ readonly id: string } | undefined)[], path: string, what: string): Fault[] {
  const seen = new Map<string, number>();
  return items.flatMap((item, i) => {
    if (item === undefined) return [];
    const first = seen.get(item.id);
    if (first === undefined) {
      seen.set(item.id, i);
      return [];
    }
    return [
      {
        code: 'duplicate-id',
        path: `${path}[${i}].id`,
        found: `the ${what} id "${item.id}" again`,
        expected: `an id that ${path}[${first}] does not have`,
      },
    ];
  });
}

function identityFaults(parts: Parts): Fault[] {
  const { assemblies } = parts;
  return [
    ...duplicates(parts.levels, 'levels', 'level'),
    ...parts.levels.flatMap((level, l) => {
      const path = `levels[${l}].diaphragms`;
      return [
        ...duplicates(level?.diaphragms ?? [], path, 'diaphragm'),
        ...(level?.diaphragms ?? []).flatMap((diaphragm, d) => [
          ...duplicates(diaphragm.openings ?? [], `${path}[${d}].openings`, 'opening'),
          ...duplicates(diaphragm.weight?.zones ?? [], `${path}[${d}].weight.zones`, 'zone'),
          ...duplicates(diaphragm.weight?.lines ?? [], `${path}[${d}].weight.lines`, 'weight line'),
        ]),
      ];
    }),
    ...duplicates(parts.wallLines, 'wallLines', 'wall line'),
    ...parts.wallLines.flatMap((line, l) =>
      (line?.storeys ?? []).flatMap((storey, s) =>
        duplicates(storey.piers, `wallLines[${l}].storeys[${s}].piers`, 'pier'),
      ),
    ),
    ...duplicates(parts.bases ?? [], 'bases', 'basis'),
    ...duplicates(parts.loadCases, 'loadCases', 'load case'),
    ...duplicates(assemblies?.diaphragms ?? [], 'assemblies.diaphragms', 'assembly'),
    ...duplicates(assemblies?.walls ?? [], 'assemblies.walls', 'assembly'),
    ...duplicates(assemblies?.holdDowns ?? [], 'assemblies.holdDowns', 'assembly'),
    ...lists(parts).flatMap(({ path, list }) => duplicates(list, path, 'combination')),
  ];
}

function elevationFaults(parts: Parts): Fault[] {
  const seen = new Map<number, number>();
  const faults = parts.levels.flatMap((level, l): Fault[] => {
    if (level === undefined) return [];
    const first = seen.get(level.elevation);
    if (first === undefined) {
      seen.set(level.elevation, l);
      return [];
    }
    return [
      {
        code: 'same-elevation',
        path: `levels[${l}].elevation`,
        found: `${level.elevation}, the elevation of levels[${first}] too`,
        expected: 'each level at an elevation of its own',
      },
    ];
  });
  const base = baseOf(parts);
  parts.levels.forEach((level, l) => {
    if (level === undefined || level.id !== base || (level.diaphragms ?? []).length === 0) return;
    faults.push({
      code: 'diaphragm-at-base',
      path: `levels[${l}].diaphragms`,
      found: `a diaphragm at ${level.id}, the lowest level`,
      expected: 'no diaphragm at the base, where everything goes into the foundation',
    });
  });
  return faults;
}

function baseOf(parts: Parts): string | undefined {
  if (!parts.levelsComplete) return undefined;
  let base = parts.levels[0];
  for (const level of parts.levels)
    if (level !== undefined && base !== undefined && level.elevation < base.elevation) base = level;
  return base?.id;
}

function levelReferences(parts: Parts): Fault[] {
  if (!parts.levelsComplete) return [];
  const ids = new Set(parts.levels.map((level) => level?.id));
  const base = baseOf(parts);
  const reference = (id: string, path: string, aboveBase: string): Fault[] => {
    if (!ids.has(id)) {
      return [
        {
          code: 'unknown-level',
          path,
          found: `the level "${id}", which the file does not have`,
          expected: 'the id of a level',
        },
      ];
    }
    if (id === base) {
      return [{ code: 'base-level', path, found: `the base level "${id}"`, expected: aboveBase }];
    }
    return [];
  };
  return [
    ...parts.wallLines.flatMap((line, l) => {
      const path = `wallLines[${l}]`;
      const seen = new Map<string, number>();
      return [
        ...(line?.storeys ?? []).flatMap((storey, s) => {
          const at = `${path}.storeys[${s}].under`;
          const faults = reference(storey.under, at, 'a level above the base, which the storey holds');
          const first = seen.get(storey.under);
          if (first !== undefined) {
            faults.push({
              code: 'duplicate-storey',
              path: at,
              found: `the storey under "${storey.under}" again`,
              expected: `each storey once; it stands at ${path}.storeys[${first}]`,
            });
          } else seen.set(storey.under, s);
          return faults;
        }),
        ...(line?.collectors ?? []).flatMap((collector, c) =>
          reference(collector.level, `${path}.collectors[${c}].level`, 'a level above the base'),
        ),
      ];
    }),
    ...parts.loadCases.flatMap((loadCase, c) => {
      if (loadCase?.from !== 'stated') return [];
      const seen = new Set<string>();
      return loadCase.forces.flatMap((force, f) => {
        const at = `loadCases[${c}].forces[${f}].level`;
        const faults = reference(force.level, at, 'a level above the base, which the force pushes');
        if (seen.has(force.level)) {
          faults.push({
            code: 'duplicate-force',
            path: at,
            found: `a second force on level "${force.level}"`,
            expected: 'one force a level',
          });
        }
        seen.add(force.level);
        const level = parts.levels.find((candidate) => candidate?.id === force.level);
        const pushed = force.force !== 0 || (force.diaphragmForce ?? 0) !== 0;
        if (faults.length === 0 && pushed && (level?.diaphragms ?? []).length === 0) {
          faults.push({
            code: 'no-diaphragm',
            path: at,
            found: `a force on level "${force.level}", which has no diaphragm`,
            expected: 'a level with a diaphragm that takes the force',
          });
        }
        return faults;
      });
    }),
  ];
}

function assemblyReferences(parts: Parts): Fault[] {
  const { assemblies } = parts;
  const check = (
    id: string | undefined,
    known: readonly { readonly id: string }[] | undefined,
    path: string,
    what: string,
  ): Fault[] =>
    id === undefined || (known ?? []).some((assembly) => assembly.id === id)
      ? []
      : [{ code: 'unknown-assembly', path, found: `"${id}"`, expected: `the id of a ${what} assembly in the file` }];
  return [
    ...parts.levels.flatMap((level, l) =>
      (level?.diaphragms ?? []).flatMap((diaphragm, d) =>
        check(diaphragm.assembly, assemblies?.diaphragms, `levels[${l}].diaphragms[${d}].assembly`, 'diaphragm'),
      ),
    ),
    ...parts.wallLines.flatMap((line, l) =>
      (line?.storeys ?? []).flatMap((storey, s) =>
        storey.piers.flatMap((pier, p) => {
          const path = `wallLines[${l}].storeys[${s}].piers[${p}]`;
          return [
            ...check(pier.assembly, assemblies?.walls, `${path}.assembly`, 'wall'),
            ...check(pier.holdDown, assemblies?.holdDowns, `${path}.holdDown`, 'hold-down'),
          ];
        }),
      ),
    ),
  ];
}

/** Demands name these components as their case. */
const GRAVITY_CASES: ReadonlySet<string> = new Set(GravityCase.options);

function loadFaults(parts: Parts): Fault[] {
  const faults: Fault[] = [];
  parts.loadCases.forEach((loadCase, c) => {
    if (loadCase === undefined || !GRAVITY_CASES.has(loadCase.id)) return;
    faults.push({
      code: 'reserved-id',
      path: `loadCases[${c}].id`,
      found: `"${loadCase.id}", the name of a component of gravity load`,
      expected: 'an id other than D, L, Lr and S',
    });
  });
  for (const { path, list } of lists(parts)) {
    list.forEach((combination, c) => {
      if (combination.factors.E === undefined || combination.factors.W === undefined) return;
      faults.push({
        code: 'two-lateral-loads',
        path: `${path}[${c}].factors`,
        found: 'factors for both E and W',
        expected: 'at most one of E and W in a combination',
      });
    });
  }
  return faults;
}

/** The lists of combinations that are the file's own, each at its place. */
function lists(parts: Parts): { readonly path: string; readonly list: readonly Combination[] }[] {
  return [
    { path: 'combinations', of: parts.combinations },
    { path: 'basis.combinations', of: parts.basis?.combinations },
    ...(parts.bases ?? []).map((basis, b) => ({ path: `bases[${b}].combinations`, of: basis?.combinations })),
  ].flatMap(({ path, of }) => (Array.isArray(of) ? [{ path, list: of }] : []));
}
