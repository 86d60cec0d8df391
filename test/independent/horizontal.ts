/**
 * The horizontal way of a whole building as one dense system: every storey's line shear, every beam's reactions and every body's motion
 * are unknowns side by side, every level at once. Flexible floors are beams with a hinge over each inner support, rigid ones three equations
 * of equilibrium, semi-rigid ones a sheet on springs (`sheet.ts`).
 */
import { LuDecomposition, Matrix } from 'ml-matrix';
import type { Building, Point } from '@groundward/engine/building/definition';
import { cross, dot, type Floor } from './plan.js';
import { acrossOf, pushesOf, reachOf, type Push, type Spread } from './push.js';
import { sheetOf, type Sheet } from './sheet.js';
import { levelsOf, meetingsOf, storeysOf, sum, type Storey } from './storeys.js';

export type Push3 = readonly [number, number, number];

/** One load on the building: its direction, the force of each level by id, and how far it is moved across itself on floors that turn. */
export type Load = {
  readonly direction: Point;
  readonly spread: Spread;
  readonly forces: ReadonlyMap<string, number>;
  /** By level id, as a part of the floor's width across the load. */
  readonly eccentricity: (level: string) => number;
};

export type Horizontal = {
  /** Shear along the line's axis, by `line/level` [force] */
  readonly shear: ReadonlyMap<string, number>;
  /** Displacements of the two edges of each rigid floor along the load, by level id [length] */
  readonly edges: ReadonlyMap<string, readonly (readonly [number, number])[]>;
};

type Body = {
  readonly floor: Floor;
  readonly level: number;
  readonly touches: readonly Storey[];
  readonly at: number;
  readonly sheet: Sheet | undefined;
};

type Beam = {
  readonly floor: Floor;
  readonly level: number;
  readonly t: Point;
  readonly s: Point;
  /** Places of the supports and their storeys. */
  readonly supports: readonly {
    readonly s: number;
    readonly storeys: readonly Storey[];
    readonly parts: readonly number[];
  }[];
  readonly at: number;
};

/** @param meshSize largest side of a cell of a semi-rigid floor [length] */
export function horizontal(building: Building, load: Load, meshSize = Infinity): Horizontal {
  const levels = levelsOf(building);
  const storeys = storeysOf(building);
  const meeting = meetingsOf(building);
  const above = (storey: Storey): Storey | undefined =>
    storeys.find(({ line, level }) => line === storey.line && level === storey.level + 1);
  /** Every wall that comes to a level from above, or goes on below it. */
  const touching = (floor: Floor, level: number): Storey[] =>
    storeys.filter((storey) => {
      const comes = storey.level === level + 1;
      const doubled = comes && storeys.some((other) => other.line === storey.line && other.level === level);
      return (storey.level === level || (comes && !doubled)) && meeting(storey.line, floor) > 0;
    });

  let size = storeys.length;
  const bodies: Body[] = [];
  const beams: Beam[] = [];
  levels.forEach(({ floors }, level) => {
    for (const floor of floors) {
      const touches = touching(floor, level);
      if (floor.behaviour === 'rigid' || floor.behaviour === 'semi-rigid') {
        const sheet = floor.behaviour === 'rigid' ? undefined : sheetOf(building, floor, touches, level, meshSize);
        bodies.push({ floor, level, touches, at: size, sheet });
        size += sheet === undefined ? 3 : sheet.unknowns;
        continue;
      }
      for (const t of directionsOf(load.direction, touches)) {
        const supports = supportsOf(touches, level, t);
        if (supports.length < 2) continue;
        beams.push({ floor, level, t, s: acrossOf(t), supports, at: size });
        size += supports.length;
      }
    }
  });

  const matrix = Matrix.zeros(size, size);
  const right = Matrix.zeros(size, 1);
  const indexOf = new Map(storeys.map((storey, i) => [storey, i]));
  const index = (storey: Storey): number => indexOf.get(storey) as number;
  const put = (row: number, column: number, value: number): void =>
    void matrix.set(row, column, matrix.get(row, column) + value);
  const bodyOf = (storey: Storey, level: number): Body | undefined =>
    bodies.find((body) => body.level === level && body.touches.some(({ line }) => line === storey.line));
  const reactionsInto = (storey: Storey, level: number, use: (column: number, factor: number) => void): void => {
    for (const beam of beams) {
      if (beam.level !== level) continue;
      beam.supports.forEach((support, i) =>
        support.storeys.forEach(({ line, along }, k) => {
          if (line === storey.line) use(beam.at + i, (support.parts[k] as number) * Math.sign(dot(along, beam.t)));
        }),
      );
    }
  };

  // Shear of every storey: what its body gives it, or what comes from above and from the beams.
  for (const storey of storeys) {
    const row = index(storey);
    put(row, row, 1);
    const body = bodyOf(storey, storey.level);
    if (body?.sheet !== undefined) body.sheet.forceInto(storey, (k, value) => put(row, body.at + k, -value));
    else if (body !== undefined) {
      const k = springsOf(body);
      armOf(storey).forEach((a, i) => put(row, body.at + i, -k(storey) * a));
    } else {
      const upper = above(storey);
      if (upper !== undefined) put(row, index(upper), -1);
      reactionsInto(storey, storey.level, (column, factor) => put(row, column, -factor));
    }
  }

  const edges = new Map<string, (readonly [number, number])[]>();
  for (const [level, { id, floors }] of levels.entries()) {
    if (level === 0 || floors.length === 0) continue;
    const force = load.forces.get(id) ?? 0;
    const s = acrossOf(load.direction);
    const kinks = beams
      .filter((beam) => beam.level === level && isParallel(beam.t, load.direction))
      .flatMap((beam) => beam.supports.map((support) => dot(support.storeys[0]?.line.axis[0] ?? [0, 0], s)));
    const pushes = pushesOf(floors, load.spread, load.direction, force, kinks);
    floors.forEach((floor, f) => {
      const own = pushes[f] as Push[];
      for (const beam of beams) {
        if (beam.floor === floor && beam.level === level) beamRows(beam, isParallel(beam.t, load.direction) ? own : []);
      }
      const body = bodies.find((candidate) => candidate.floor === floor && candidate.level === level);
      if (body?.sheet !== undefined) sheetRows(body, body.sheet, load);
      else if (body !== undefined) bodyRows(body, own, load, id);
    });
  }

  const solution = new LuDecomposition(matrix).solve(right).to1DArray();
  for (const body of bodies) {
    if (body.sheet !== undefined) continue;
    const { id } = levels[body.level] as { id: string };
    const u = solution.slice(body.at, body.at + 3) as [number, number, number];
    const s = acrossOf(load.direction);
    const along = (at: number): number =>
      u[0] * load.direction[0] + u[1] * load.direction[1] + u[2] * at * cross(s, load.direction);
    const [from, to] = reachOf(body.floor, s);
    edges.set(id, [...(edges.get(id) ?? []), [along(from), along(to)]]);
  }
  return {
    shear: new Map(
      storeys.map((storey, i) => [`${storey.line.id}/${levels[storey.level]?.id}`, solution[i] as number]),
    ),
    edges,
  };

  /** Equilibrium of forces, of moments, and no moment over each inner support. */
  function beamRows(beam: Beam, pushes: readonly Push[]): void {
    const { supports, at } = beam;
    const arms = (from: number): ((s: number) => number)[] => [
      () => 1,
      (s) => s - from,
      ...supports.slice(1, -1).map((inner) => (s: number) => (s < inner.s ? inner.s - s : 0)),
    ];
    const first = supports[0]?.s ?? 0;
    arms(first).forEach((arm, equation) => {
      const row = at + equation;
      supports.forEach((support, i) => put(row, at + i, arm(support.s)));
      right.set(row, 0, sum(pushes.map((push) => push.force * arm(push.s))));
      for (const storey of storeys) {
        const share = stopsOn(storey, beam);
        if (share === 0) continue;
        put(row, index(storey), -share * Math.sign(dot(storey.along, beam.t)) * arm(dot(storey.line.axis[0], beam.s)));
      }
    });
  }

  /** The part of the shear of a wall above that a beam takes because the wall stops there. */
  function stopsOn(storey: Storey, beam: Beam): number {
    if (storey.level !== beam.level + 1 || !isParallel(storey.along, beam.t)) return 0;
    if (storeys.some((other) => other.line === storey.line && other.level === beam.level)) return 0;
    if (bodyOf(storey, beam.level) !== undefined) return 0;
    const met = (levels[beam.level]?.floors ?? []).map((floor) => meeting(storey.line, floor));
    return meeting(storey.line, beam.floor) / sum(met);
  }

  /** Three equations of equilibrium about the origin of the plan. */
  function bodyRows(body: Body, pushes: readonly Push[], { direction, eccentricity }: Load, id: string): void {
    const s = acrossOf(direction);
    const [from, to] = reachOf(body.floor, s);
    const by = eccentricity(id) * (to - from);
    const k = springsOf(body);
    const loads = pushes.map((push): Push3 => {
      const turn = cross(s, direction) * (push.s + by);
      return [push.force * direction[0], push.force * direction[1], push.force * turn];
    });
    for (let i = 0; i < 3; i++) {
      right.set(body.at + i, 0, sum(loads.map((each) => each[i] as number)));
      for (const storey of body.touches) {
        const a = armOf(storey);
        if (storey.level === body.level) {
          for (let j = 0; j < 3; j++) put(body.at + i, body.at + j, k(storey) * (a[i] as number) * (a[j] as number));
        }
        arrivals(storey, body.level, (column, factor) => put(body.at + i, column, -factor * (a[i] as number)));
      }
    }
  }

  function sheetRows(body: Body, sheet: Sheet, { direction, spread, forces }: Load): void {
    sheet.stiffness((i, j, value) => put(body.at + i, body.at + j, value));
    const force = forces.get(levels[body.level]?.id ?? '') ?? 0;
    sheet.push(direction, spread, force).forEach((value, i) => right.set(body.at + i, 0, value));
    for (const storey of body.touches) {
      arrivals(storey, body.level, (column, factor) =>
        sheet.spreadAlong(storey, (k, value) => put(body.at + k, column, -factor * value)),
      );
    }
  }

  /** What comes to a body along one of its lines: the wall above, and beams beside it that rest on the line. */
  function arrivals(storey: Storey, level: number, use: (column: number, factor: number) => void): void {
    const upper = storeys.find((other) => other.line === storey.line && other.level === level + 1);
    if (upper !== undefined) use(index(upper), 1);
    reactionsInto(storey, level, use);
  }
}

/** Stiffness of the walls under a rigid floor: by length where any of them has none. */
function springsOf({ touches, level }: Body): (storey: Storey) => number {
  const below = touches.filter((storey) => storey.level === level);
  const absolute = below.every(({ stiffness }) => stiffness !== undefined);
  return ({ stiffness, pierLength }) => (absolute ? (stiffness ?? 0) : pierLength);
}

function armOf({ line, along }: Storey): Push3 {
  return [along[0], along[1], cross(line.axis[0], along)];
}

function isParallel(a: Point, b: Point): boolean {
  return Math.abs(cross(a, b)) < 1e-6;
}

/** The load's direction, and that of every wall that might bring a force. */
function directionsOf(direction: Point, touches: readonly Storey[]): Point[] {
  const found: Point[] = [direction];
  for (const { along } of touches) if (!found.some((known) => isParallel(known, along))) found.push(along);
  return found;
}

/** Walls below a flexible floor along t, by their place; those in one plane are one support. */
function supportsOf(touches: readonly Storey[], level: number, t: Point): Beam['supports'] {
  const s = acrossOf(t);
  const place = ({ line }: Storey): number => dot(line.axis[0], s);
  const below = touches.filter((storey) => storey.level === level && isParallel(storey.along, t));
  const groups: Storey[][] = [];
  for (const storey of [...below].sort((a, b) => place(a) - place(b))) {
    const last = groups[groups.length - 1];
    if (last?.[0] !== undefined && place(storey) - place(last[0]) < 1e-6) last.push(storey);
    else groups.push([storey]);
  }
  return groups.map((group) => {
    const stated = group.every(({ statedStiffness }) => statedStiffness !== undefined);
    const weights = group.map((storey) => (stated ? (storey.statedStiffness ?? 0) : storey.pierLength));
    return { s: place(group[0] as Storey), storeys: group, parts: weights.map((weight) => weight / sum(weights)) };
  });
}

/** The direction of a load on plan. */
export function directionOf(degrees: number): Point {
  const angle = (degrees * Math.PI) / 180;
  const [x, y] = [Math.cos(angle), Math.sin(angle)];
  return [Math.abs(x) < 1e-15 ? 0 : x, Math.abs(y) < 1e-15 ? 0 : y];
}
