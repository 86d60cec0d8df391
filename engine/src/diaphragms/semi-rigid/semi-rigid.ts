/** One semi-rigid level: what arrives from the walls above and the level's inertia, through the membrane, into the walls below. */
import type { Profile } from '../../geometry/profile.js';
import type { Vector3 } from '../../statics/small-matrix.js';
import type { LineModel } from '../../walls/wall-line.js';
import type { Inertia } from '../inertia.js';
import { displacementOf } from '../rigid.js';
import { inertiaLoad } from './inertia-load.js';
import type { MembraneModel } from './membrane-model.js';
import { alongLine, responseTo, type Response } from './response.js';

/** A membrane with the responses to unit loads that it has been asked for: each is solved once, and everything else is a sum of them. */
export type SemiRigidBody = {
  readonly model: MembraneModel;
  readonly solved: Map<LineModel | string, UnitResponse>;
};

type UnitResponse = Response & { readonly resultant: Vector3 };

export type SemiRigidOutcome = {
  /** Into each line with a wall below, along its axis, by channel [force] */
  readonly given: Map<LineModel, Float64Array>;
  /** Motion of the same diaphragm if it were rigid, about the rigid model's origin, by channel. */
  readonly motion: readonly Vector3[];
  /** u_x, u_y of every node in the diaphragm's axes, by channel [length] */
  readonly displacement: readonly Float64Array[];
};

export function semiRigidBody(model: MembraneModel): SemiRigidBody {
  return { model, solved: new Map() };
}

/**
 * @param inertia with its force by channel along the frame's t [force]
 * @param taken   what walls above hand to the diaphragm along their axis, by channel [force]
 */
export function throughSemiRigid(
  body: SemiRigidBody,
  inertia: Inertia,
  force: Float64Array,
  taken: ReadonlyMap<LineModel, Float64Array>,
): SemiRigidOutcome {
  const { model } = body;
  const channels = force.length;
  const sources = [...taken]
    .filter(([, values]) => values.some((value) => value !== 0))
    .map(([line, values]) => ({ unit: ofLine(body, line), values }));
  if (inertia.share > 0 && force.some((value) => value !== 0)) {
    for (const { unit, part } of ofInertia(body, inertia))
      sources.push({ unit, values: force.map((value) => value * part) });
  }
  const held = model.lines.filter((line) => line.k > 0);
  const given = new Map(held.map(({ line }) => [line, new Float64Array(channels)]));
  const motion: Vector3[] = [];
  const displacement: Float64Array[] = [];
  for (let c = 0; c < channels; c++) {
    const u = new Float64Array(2 * model.mesh.x.length);
    const resultant: [number, number, number] = [0, 0, 0];
    for (const { unit, values } of sources) {
      const value = values[c] as number;
      if (value === 0) continue;
      for (let i = 0; i < u.length; i++) u[i] = (u[i] as number) + value * (unit.displacement[i] as number);
      for (let i = 0; i < 3; i++) resultant[i] = (resultant[i] as number) + value * (unit.resultant[i] as number);
      model.lines.forEach(({ line }, l) => {
        const into = given.get(line);
        if (into !== undefined) into[c] = (into[c] as number) + value * (unit.given[l] as number);
      });
    }
    displacement.push(u);
    motion.push(resultant.every((value) => value === 0) ? [0, 0, 0] : displacementOf(model.rigid, resultant));
  }
  return { given, motion, displacement };
}

function ofLine(body: SemiRigidBody, line: LineModel): UnitResponse {
  return solvedOnce(body, line, () => alongLine(body.model, line));
}

/** Linear in the eccentricity: that without and that with one of the whole width, in parts that add up to 1. */
function ofInertia(body: SemiRigidBody, inertia: Inertia): { unit: UnitResponse; part: number }[] {
  const profile = inertia.diaphragm.profiles[inertia.frame] as Profile;
  const width = profile.to - profile.from;
  const centre = inertia.centre - inertia.offset;
  const shape = inertia.facade === undefined ? '' : JSON.stringify(inertia.facade);
  const key = `${inertia.frame} ${inertia.spread} ${inertia.perUnit} ${inertia.liveShare} ${shape}`;
  const at = (offset: number): UnitResponse =>
    solvedOnce(body, `${key} ${offset === 0 ? 'centred' : 'shifted'}`, () =>
      inertiaLoad(body.model, { ...inertia, offset, centre: centre + offset }),
    );
  if (inertia.offset === 0) return [{ unit: at(0), part: 1 }];
  const part = inertia.offset / width;
  return [
    { unit: at(0), part: 1 - part },
    { unit: at(width), part },
  ];
}

function solvedOnce(
  { model, solved }: SemiRigidBody,
  key: LineModel | string,
  loadOf: () => { load: Float64Array; resultant: Vector3 },
): UnitResponse {
  let known = solved.get(key);
  if (known === undefined) {
    const { load, resultant } = loadOf();
    known = { ...responseTo(model, load, resultant), resultant };
    solved.set(key, known);
  }
  return known;
}
