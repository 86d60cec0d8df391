/** A semi-rigid diaphragm: a membrane on its wall lines, assembled and factored once for all loads. */
import type { Building, Point, Ring } from '../../building/definition.js';
import type { Fault } from '../../building/fault.js';
import { Refusal } from '../../building/refusal.js';
import { toPlan, totalLength, type Interval } from '../../geometry/profile.js';
import { factorise, type ElementStiffness, type Factor } from '../../statics/frontal-cholesky.js';
import type { LineModel, StoreyModel } from '../../walls/wall-line.js';
import type { DiaphragmModel } from '../diaphragm.js';
import type { RigidModel } from '../rigid.js';
import type { Segment } from './arrangement.js';
import { axesOf, toLocal, turned, type Axes } from './axes.js';
import { membraneElements, stretchElements, type Sheet } from './membrane.js';
import { areaOf, meshOf, type Mesh } from './mesh.js';

/** A wall line where it meets the mesh. */
export type MeshLine = {
  readonly line: LineModel;
  /** Its direction in the diaphragm's axes. */
  readonly along: readonly [number, number];
  readonly stretches: readonly Int32Array[];
  readonly length: number;
  /** Stiffness along the line [force/length]; 0 where no wall stands under it. */
  readonly k: number;
};

export type MembraneModel = {
  readonly diaphragm: DiaphragmModel;
  /** The same walls under a rigid diaphragm. */
  readonly rigid: RigidModel;
  readonly axes: Axes;
  readonly mesh: Mesh;
  readonly lines: readonly MeshLine[];
  /** Membrane, chords and walls. */
  readonly elements: readonly ElementStiffness[];
  /** The walls alone. */
  readonly springs: readonly ElementStiffness[];
  readonly factor: Factor;
  readonly sheet: Sheet;
  /** E·A of the chords along outline and openings [force]; 0 without. */
  readonly chord: number;
  /** Mesh size [length] */
  readonly size: number;
  /** What the file left out. */
  readonly assumed: { readonly axial: boolean; readonly size: boolean };
};

/** Without any stated axial stiffness the membrane is this many times as stiff along its axes as in shear: it bends next to nothing. */
export const AXIAL_OVER_SHEAR = 1000;
/** With stated chords alone the membrane itself has A = 2·G·t, the isotropic membrane without Poisson's effect. */
export const AXIAL_WITH_CHORDS = 2;
/** The default mesh has this many rectangles on a square floor. */
const DEFAULT_RECTANGLES = 256;
const MOST_NODES = 100_000;
/** A mesh covers the floor, and each wall line its cut, to within this part. */
const COVERED = 1e-6;

export type Stiffnesses = {
  /** G·t [force/length] */
  readonly shear: number;
  readonly axial?: number | undefined;
  readonly chord?: number | undefined;
  readonly size?: number | undefined;
};

/** @throws Refusal `no-shear-stiffness` where the diaphragm names no assembly with one */
export function stiffnessesOf(building: Building, diaphragm: DiaphragmModel): Stiffnesses {
  const assembly = building.assemblies?.diaphragms?.find((a) => a.id === diaphragm.diaphragm.assembly);
  const shear = assembly?.apparentShearStiffness;
  if (shear === undefined) {
    throw new Refusal([
      {
        code: 'no-shear-stiffness',
        path: `${diaphragm.path}.assembly`,
        found: `semi-rigid diaphragm ${diaphragm.key} without a shear stiffness`,
        expected: 'an assembly with apparentShearStiffness',
      },
    ]);
  }
  return {
    shear,
    axial: assembly?.axialStiffness,
    chord: assembly?.chordStiffness,
    size: diaphragm.diaphragm.meshSize,
  };
}

/**
 * @param rigid  the same diaphragm as a rigid body, which shows that its walls hold it
 * @param runsOn where a wall line and its collector run on the floor, as intervals of t in the line's family
 * @throws Refusal `no-wall-stiffness`, `mesh-too-fine`, `no-mesh`, `no-collector`
 */
export function membraneModel(
  diaphragm: DiaphragmModel,
  rigid: RigidModel,
  stiffnesses: Stiffnesses,
  runsOn: (line: LineModel) => readonly Interval[],
): MembraneModel {
  if (!rigid.absolute) throw new Refusal([noWallStiffness(diaphragm)]);
  const { outline, openings = [], weight } = diaphragm.diaphragm;
  const axes = axesOf(outline);
  const local = (ring: Ring): Ring => ring.map((point) => toLocal(axes, point));
  const touching = diaphragm.touches.map((touch) => touch.line);
  const intervals = touching.map((line) => {
    const on = runsOn(line);
    if (totalLength(on) === 0) throw new Refusal([noCollector(diaphragm, line)]);
    return on;
  });
  const plan = {
    outline: local(outline),
    openings: openings.map((opening) => local(opening.outline)),
    zones: (weight?.zones ?? []).map((zone) => local(zone.outline)),
    lines: touching.map((line, i) => stretchesOf(axes, line, intervals[i] as readonly Interval[])),
  };
  const extent = extentOf(plan.outline);
  const { area } = diaphragm.mass;
  const size = stiffnesses.size ?? Math.sqrt(area / DEFAULT_RECTANGLES);
  // Four nodes for each rectangle of the grid.
  const nodes = (4 * area) / (size * size);
  if (!(nodes <= MOST_NODES)) throw new Refusal([tooFine(diaphragm, nodes)]);
  const mesh = meshOf(plan, extent, size);
  if (mesh === undefined || Math.abs(areaOf(mesh) - area) > COVERED * area) throw new Refusal([noMesh(diaphragm)]);
  if (mesh.x.length > MOST_NODES) throw new Refusal([tooFine(diaphragm, mesh.x.length)]);

  const lines = touching.map((line, i): MeshLine => {
    const stretches = mesh.lines[i] as readonly Int32Array[];
    const storey: StoreyModel | undefined = line.storeys[diaphragm.level];
    const length = stretches.reduce((sum, stretch) => sum + lengthOf(mesh, stretch), 0);
    const cut = totalLength(intervals[i] as readonly Interval[]);
    if (Math.abs(length - cut) > COVERED * cut) throw new Refusal([noMesh(diaphragm)]);
    return { line, along: turned(axes, line.along), stretches, length, k: storey?.stiffness ?? 0 };
  });
  const chord = stiffnesses.chord ?? 0;
  const axial = stiffnesses.axial ?? stiffnesses.shear * (chord > 0 ? AXIAL_WITH_CHORDS : AXIAL_OVER_SHEAR);
  const sheet = { axial, shear: stiffnesses.shear };
  const elements = membraneElements(mesh, sheet);
  if (chord > 0) elements.push(...stretchElements(mesh, mesh.border, 'bar', chord));
  const springs = lines.flatMap(({ stretches, k, length, along }) =>
    k > 0 ? stretchElements(mesh, stretches, 'spring', k / length, along) : [],
  );
  elements.push(...springs);
  const factor = factorise(elements, mesh.x.length);
  if (factor === undefined) throw new Refusal([singular(diaphragm)]);
  return {
    diaphragm,
    rigid,
    axes,
    mesh,
    lines,
    elements,
    springs,
    factor,
    sheet,
    chord,
    size,
    assumed: { axial: stiffnesses.axial === undefined, size: stiffnesses.size === undefined },
  };
}

/** Along the axis from its first point on, whichever way the family runs, so that a turned plan is meshed alike. */
function stretchesOf(axes: Axes, line: LineModel, intervals: readonly Interval[]): Segment[] {
  const place = (t: number): Point => toLocal(axes, toPlan(line.frame, line.s, t));
  const along = intervals.map(([a, b]) =>
    line.sign > 0 ? { a: place(a), b: place(b) } : { a: place(b), b: place(a) },
  );
  return line.sign > 0 ? along : along.reverse();
}

export function lengthOf({ x, y }: Mesh, stretch: Int32Array): number {
  const from = stretch[0] as number;
  const to = stretch[2] as number;
  return Math.hypot((x[to] as number) - (x[from] as number), (y[to] as number) - (y[from] as number));
}

function extentOf(outline: readonly Point[]): number {
  const x = outline.map((point) => point[0]);
  const y = outline.map((point) => point[1]);
  return Math.max(Math.max(...x) - Math.min(...x), Math.max(...y) - Math.min(...y));
}

function noWallStiffness(diaphragm: DiaphragmModel): Fault {
  return {
    code: 'no-wall-stiffness',
    path: diaphragm.path,
    found: `semi-rigid diaphragm ${diaphragm.key} on walls that do not all have a stiffness`,
    expected: 'a stiffness, or an assembly with apparentShearStiffness, for every pier under it',
  };
}

function noCollector(diaphragm: DiaphragmModel, line: LineModel): Fault {
  return {
    code: 'no-collector',
    path: `wallLines[${line.index}]`,
    found: `wall line ${line.line.id} without floor or collector along it in diaphragm ${diaphragm.key}`,
    expected: 'a collector, or a cut of the diaphragm, along the line',
  };
}

function tooFine(diaphragm: DiaphragmModel, nodes: number): Fault {
  return {
    code: 'mesh-too-fine',
    path: `${diaphragm.path}.meshSize`,
    found: `a mesh of about ${Math.round(nodes)} nodes`,
    expected: `at most ${MOST_NODES}`,
    hint: 'state a larger mesh size',
  };
}

function noMesh(diaphragm: DiaphragmModel): Fault {
  return {
    code: 'no-mesh',
    path: diaphragm.path,
    found: `diaphragm ${diaphragm.key}, whose outline, openings and wall lines no mesh could follow`,
    expected: 'edges that do not run so close to one another',
    hint: 'state a mesh size, or merge edges that nearly coincide',
  };
}

function singular(diaphragm: DiaphragmModel): Fault {
  return {
    code: 'singular',
    path: diaphragm.path,
    found: `semi-rigid diaphragm ${diaphragm.key}, whose stiffness is singular to working precision`,
    expected: 'stiffnesses of membrane and walls that lie less far apart',
  };
}
