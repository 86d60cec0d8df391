/** The horizontal forces of a case as they go down the building: what every level adds to every wall line, and what goes on. */
import type { WallLine } from '@groundward/engine/building/definition';
import { axisOf, directionOf, levelsAscending, type Facts, type Loading } from './demands';

/** A column of the schematic: a wall line. Forces are counted along the load, positive with it. */
export type FlowColumn = {
  readonly line: WallLine;
  /** Lines across the load carry only the couple of torsion; they stand apart and take no part in the level's balance. */
  readonly across: boolean;
};

/** One wall line at one level. */
export type FlowStep = {
  readonly column: number;
  /** Shear of the storey above; 0 without a wall there */
  readonly above: number;
  /** What the level's diaphragm gives to the line; negative where it takes; minus `above` where the line stops */
  readonly reaction: number;
  /** Shear of the storey under the level */
  readonly shear: number;
  /** What the diaphragm carries past the line, left and right of it; both 0 for lines across the load */
  readonly before: number;
  readonly after: number;
  /** Along the line's own axis, as the demand table has them; undefined where no wall stands. */
  readonly said: { readonly reaction: number | undefined; readonly shear: number | undefined };
};

export type FlowLevel = {
  readonly id: string;
  readonly name: string;
  readonly force: number;
  readonly storeyShear: number;
  readonly masses: readonly { readonly member: string; readonly name: string; readonly part: number }[];
  readonly steps: readonly FlowStep[];
};

export type FlowFoot = {
  readonly member: string;
  readonly column: number;
  readonly pier: string;
  readonly shear: number;
};

export type Flow = {
  readonly columns: readonly FlowColumn[];
  /** From the top down, without the base. */
  readonly levels: readonly FlowLevel[];
  readonly base: string;
  readonly feet: readonly FlowFoot[];
};

export function flowOf(facts: Facts, { caseId, sense }: Loading): Flow {
  const { building, analysis, index } = facts;
  const along = directionOf(analysis, caseId) ?? [1, 0];
  const ascending = levelsAscending(building);
  const columns = columnsOf(building.wallLines, along);
  // Counted along the load as it acts, so that a reversed case is drawn as the case itself.
  const signOf = (line: WallLine): number => {
    const { u } = axisOf(line);
    const cosine = u[0] * along[0] + u[1] * along[1];
    return (Math.abs(cosine) < 0.02 ? 1 : cosine) * sense;
  };
  const levels = ascending.slice(1).map((level, i): FlowLevel => {
    const next = ascending[i + 2];
    const own = (index.of(level.id, 'force', caseId, sense)?.value ?? 0) * sign(level.id, facts, { caseId, sense });
    let carried = own;
    const steps = columns.map(({ line, across }, column): FlowStep => {
      const stands = line.storeys.some(({ under }) => under === level.id);
      const reads = (id: string | undefined, what: 'shear' | 'reaction'): number | undefined =>
        id === undefined ? undefined : index.of(`${line.id}/${id}`, what, caseId, sense)?.value;
      const above = (reads(next?.id, 'shear') ?? 0) * signOf(line);
      const said = { reaction: reads(level.id, 'reaction'), shear: reads(level.id, 'shear') };
      const shear = stands ? (said.shear ?? 0) * signOf(line) : 0;
      const reaction = stands ? (said.reaction ?? 0) * signOf(line) : -above;
      const before = across ? 0 : carried;
      if (!across) carried -= reaction;
      return { column, above, reaction, shear, before, after: across ? 0 : carried, said };
    });
    return {
      id: level.id,
      name: level.name ?? level.id,
      force: own,
      storeyShear: index.of(level.id, 'storey-shear', caseId, sense)?.value ?? 0,
      masses: massesOf(facts, level.id, caseId),
      steps,
    };
  });
  return {
    columns,
    levels: levels.reverse(),
    base: ascending[0]?.name ?? ascending[0]?.id ?? '',
    feet: feetOf(facts, columns, { caseId, sense }, signOf),
  };
}

/** Level forces are magnitudes; a stated force may act against the case. */
function sign(level: string, { building }: Facts, { caseId }: Loading): number {
  const stated = building.loadCases.find(({ id }) => id === caseId.split('/')[0]);
  if (stated?.from !== 'stated') return 1;
  const force = stated.forces.find((candidate) => candidate.level === level)?.force ?? 0;
  return force < 0 ? -1 : 1;
}

/** Lines along the load in the order in which the span meets them, then those across it. */
function columnsOf(lines: readonly WallLine[], along: readonly [number, number]): FlowColumn[] {
  const place = ({ axis: [a, b] }: WallLine, [ex, ey]: readonly [number, number]): number =>
    ((a[0] + b[0]) / 2) * ex + ((a[1] + b[1]) / 2) * ey;
  const across: [number, number] =
    Math.abs(along[1]) > Math.abs(along[0]) ? [along[1], -along[0]] : [-along[1], along[0]];
  const parted = lines.map((line): FlowColumn => {
    const { u } = axisOf(line);
    return { line, across: Math.abs(u[0] * along[0] + u[1] * along[1]) < 0.02 };
  });
  return [
    ...parted.filter((column) => !column.across).sort((a, b) => place(a.line, across) - place(b.line, across)),
    ...parted.filter((column) => column.across).sort((a, b) => place(a.line, along) - place(b.line, along)),
  ];
}

/** The diaphragms of a level with the part of its force that each one’s mass has. */
function massesOf({ building, analysis }: Facts, level: string, caseId: string): FlowLevel['masses'] {
  const diaphragms = building.levels.find(({ id }) => id === level)?.diaphragms ?? [];
  const sums = diaphragms.map(({ id }) =>
    analysis.path.edges.reduce(
      (sum, edge) => (edge.case === caseId && edge.from === `mass:${level}/${id}` ? sum + Math.abs(edge.force) : sum),
      0,
    ),
  );
  const total = sums.reduce((sum, part) => sum + part, 0);
  return diaphragms.map(({ id, name }, i) => ({
    member: `${level}/${id}`,
    name: name ?? id,
    part: total === 0 ? 1 / diaphragms.length : (sums[i] ?? 0) / total,
  }));
}

function feetOf(
  { building, index }: Facts,
  columns: readonly FlowColumn[],
  { caseId, sense }: Loading,
  signOf: (line: WallLine) => number,
): FlowFoot[] {
  const lowest = levelsAscending(building)[1]?.id ?? '';
  return columns.flatMap(({ line }, column) =>
    (line.storeys.find(({ under }) => under === lowest)?.piers ?? []).map((pier) => ({
      member: `${line.id}/${pier.id}`,
      column,
      pier: pier.id,
      shear: (index.of(`${line.id}/${lowest}/${pier.id}`, 'shear', caseId, sense)?.value ?? 0) * signOf(line),
    })),
  );
}

/** Members above and below one in the path under a case, itself included. */
export function connected({ analysis }: Facts, member: string, caseId: string): ReadonlySet<string> {
  const memberOf = new Map(analysis.path.nodes.map((node) => [node.id, node.member]));
  const edges = analysis.path.edges.filter(
    (edge) => edge.case === caseId && edge.acts === 'horizontal' && Math.abs(edge.force) > 1e-9,
  );
  const found = new Set<string>([member]);
  for (const [near, far] of [
    ['to', 'from'],
    ['from', 'to'],
  ] as const) {
    const next = new Map<string, string[]>();
    for (const edge of edges) next.set(edge[near], [...(next.get(edge[near]) ?? []), edge[far]]);
    let open = analysis.path.nodes.filter((node) => node.member === member).map(({ id }) => id);
    const seen = new Set(open);
    while (open.length > 0) {
      open = open.flatMap((id) => next.get(id) ?? []).filter((id) => !seen.has(id));
      for (const id of open) {
        seen.add(id);
        found.add(memberOf.get(id) ?? id);
      }
    }
  }
  return found;
}
