/** A rigid diaphragm on its wall lines: the resultant of all that acts on it, about the centre of rigidity, and what each line takes. */
import { dot } from '../geometry/frame.js';
import type { Profile } from '../geometry/profile.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import type { LineModel } from '../walls/wall-line.js';
import { casePath, fromDemand, fromFile, linePath, readOff, runOf, type Context } from './context.js';
import { flexibleGives } from './flexible-reaction.js';
import { bodyMember } from './body-member.js';
import { levelInertias, totalStep } from './floor-total.js';
import { pushStep, type ForceSet } from './level-push.js';
import { alongAxis, armStep, cosinesOf, cosineValues, joined, stiffnessStep, type Cosines } from './plan-arms.js';
import { raisedShear } from './raised.js';
import type { Steps, Value } from './steps.js';

type Spring = { readonly k: Value; readonly r: Value; readonly cosines: Cosines };

/** Whether the accidental eccentricity is taken as stated, or amplified. */
export type Torsion = 'plain' | 'amplified';

export type RigidSteps = {
  readonly context: Context;
  readonly steps: Steps;
  readonly springs: ReadonlyMap<LineModel, Spring>;
  /** What arrives from walls above and from flexible diaphragms beside, along the line's axis. */
  readonly arriving: ReadonlyMap<LineModel, readonly Value[]>;
  /** Place of the centre of rigidity across the load. */
  readonly acrossR: Value;
  readonly ux: Value;
  readonly uy: Value;
  readonly turn: Value;
};

/** The centre of rigidity, as demands of the level. */
export function centreOf(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  what: 'mass' | 'rigidity',
): { readonly x: Value; readonly y: Value } {
  const member = bodyMember(context, outcome);
  const tag = what === 'mass' ? 'M' : 'R';
  const x = fromDemand(context, `x_${tag}`, of, member, `centre-of-${what}-x`);
  const y = fromDemand(context, `y_${tag}`, of, member, `centre-of-${what}-y`);
  if (x === undefined || y === undefined) throw new Error(`no centre of ${what} of ${member}`);
  return { x, y };
}

/** The moment about the centre of rigidity of all that acts on the diaphragm, with what it is made of. */
export function resultantSteps(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  set: ForceSet,
  steps: Steps,
  torsion: Torsion = 'amplified',
) {
  const { diaphragm, pushed } = outcome;
  const profile = diaphragm.profiles[pushed.inertia.frame] as Profile;
  const { s, t } = profile.frame;
  const centre = centreOf(context, of, outcome, 'rigidity');
  const level = context.model.levels[diaphragm.level];
  if (level === undefined) throw new Error(`no level of ${diaphragm.key}`);
  let force = pushStep(context, of, level.id, set, 1, steps, steps.fresh('F'));
  if (level.diaphragms.length > 1) {
    const own = totalStep(context, [pushed.inertia], steps, 'n');
    const whole = totalStep(context, levelInertias(context, of, level.index), steps);
    force = steps.add('F_d', `${force.symbol}·${own.symbol}/${whole.symbol}`, [force, own, whole], force.unit, {
      what: `part of the level’s force on diaphragm ${diaphragm.key}`,
    });
  }
  const place = placeOfPush(context, of, outcome, steps, torsion);
  const acrossR = acrossValue(context, centre, s, steps, 's_R', 'centre of rigidity across the load');
  const arms = new Map<LineModel, Value>();
  const arriving = new Map<LineModel, Value[]>();
  let next = 0;
  const armOf = (line: LineModel): Value => {
    let arm = arms.get(line);
    if (arm === undefined) arms.set(line, (arm = armStep(context, line, centre, steps, String(++next))));
    return arm;
  };
  for (const line of outcome.taken.keys()) {
    const values = arrives(context, of, line, outcome, set, steps, torsion);
    if (values.length > 0) arriving.set(line, values);
  }
  const turns = s[0] * t[1] - s[1] * t[0] > 0;
  const terms = [`${turns ? '+' : '−'} ${force.symbol}·(${place.symbol} − ${acrossR.symbol})`];
  const values: Value[] = [force, place, acrossR];
  for (const [line, forces] of arriving) {
    for (const each of forces) {
      terms.push(`+ ${each.symbol}·${armOf(line).symbol}`);
      values.push(each, armOf(line));
    }
  }
  const moment = steps.add('T', joined(terms), values, context.units.moment, {
    what: 'moment about the centre of rigidity, anticlockwise',
    clause: 'statics',
  });
  return { force, arriving, armOf, moment, acrossR, frame: profile.frame };
}

/** Steps down to the motion of the body: along x, along y, and about the centre of rigidity. */
export function rigidBody(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  set: ForceSet,
  steps: Steps,
  torsion: Torsion = 'amplified',
): RigidSteps {
  const model = outcome.rigid?.model;
  if (model === undefined) throw new Error(`${outcome.diaphragm.key} is no body`);
  const { force, arriving, armOf, moment, acrossR, frame } = resultantSteps(context, of, outcome, set, steps, torsion);
  const springs = new Map<LineModel, Spring>();
  for (const { line } of model.springs) {
    const storey = line.storeys[outcome.diaphragm.level];
    if (storey === undefined) continue;
    const r = armOf(line);
    const tag = r.symbol.slice(2);
    const k = stiffnessStep(context, storey, model.absolute, steps, tag);
    springs.set(line, { k, r, cosines: cosinesOf(context, line, `_${tag}`) });
  }
  const all = [...springs.values()];
  const { unit } = all[0]?.k ?? { unit: '1' };
  const clause = 'K = Σ k·a·aᵀ over the wall lines';
  const product = (a: 'x' | 'y', b: 'x' | 'y'): Value => {
    const terms = all.map(({ k, cosines }) => {
      const [first, second] = [cosines[a], cosines[b]];
      if (first === undefined || second === undefined) return '';
      const factors = [k, first.value, second.value].flatMap((value) => (value === undefined ? [] : [value.symbol]));
      return `${first.sign * second.sign < 0 ? '−' : '+'} ${factors.join('·')}`;
    });
    const values = all.flatMap(({ k, cosines }) => [k, ...cosineValues(cosines)]);
    return steps.add(`K_${a}${b}`, joined(terms), values, unit, { clause });
  };
  const kxx = product('x', 'x');
  const kyy = product('y', 'y');
  const skew = all.some(({ cosines }) => cosines.x !== undefined && cosines.y !== undefined);
  const kxy = skew ? product('x', 'y') : undefined;
  const j = steps.add(
    'J',
    all.map(({ k, r }) => `${k.symbol}·${r.symbol}^2`).join(' + '),
    all.flatMap(({ k, r }) => [k, r]),
    `${unit}·${context.units.length}²`,
    {
      what: 'torsional stiffness about the centre of rigidity',
      clause,
    },
  );
  const along = (axis: 'x' | 'y', part: number): Value => {
    const values: Value[] = [];
    const terms: string[] = [];
    if (part !== 0) {
      values.push(force);
      if (Math.abs(part) === 1) terms.push(`${part > 0 ? '+' : '−'} ${force.symbol}`);
      else {
        const cosine = readOff(
          context,
          `t_${axis}`,
          `${casePath(context, of.case)}.direction`,
          part,
          '1',
          'direction of the load',
        );
        values.push(cosine);
        terms.push(`+ ${force.symbol}·${cosine.symbol}`);
      }
    }
    for (const [line, forces] of arriving) {
      const cosines = cosinesOf(context, line, `_${armOf(line).symbol.slice(2)}`);
      if (cosines[axis] === undefined) continue;
      for (const each of forces) {
        terms.push(alongAxis(cosines[axis], each.symbol));
        values.push(each, ...cosineValues(cosines));
      }
    }
    return steps.add(`F_${axis}`, joined(terms), values, context.units.force, { what: `all that acts along ${axis}` });
  };
  const fx = along('x', frame.t[0]);
  const fy = along('y', frame.t[1]);
  const moves = model.absolute ? context.units.length : `${context.units.force}/${unit}`;
  const solved = { clause: 'K·u = F', what: 'displacement of the centre of rigidity' };
  let ux: Value;
  let uy: Value;
  if (kxy === undefined) {
    ux = steps.add('u_x', 'F_x/K_xx', [fx, kxx], moves, solved);
    uy = steps.add('u_y', 'F_y/K_yy', [fy, kyy], moves, solved);
  } else {
    const values = [fx, fy, kxx, kyy, kxy];
    ux = steps.add('u_x', '(K_yy·F_x − K_xy·F_y)/(K_xx·K_yy − K_xy^2)', values, moves, solved);
    uy = steps.add('u_y', '(K_xx·F_y − K_xy·F_x)/(K_xx·K_yy − K_xy^2)', values, moves, solved);
  }
  const turn = steps.add('θ', 'T/J', [moment, j], '1', { what: 'rotation', clause: 'K·u = F' });
  return { context, steps, springs, arriving, acrossR, ux, uy, turn };
}

/** The line's share: its direct part and its torsional part. */
export function rigidShear(
  { context, steps, springs, ux, uy, turn }: RigidSteps,
  line: LineModel,
  symbol: string,
): Value {
  const spring = springs.get(line);
  if (spring === undefined) throw new Error(`line ${line.line.id} holds no such body`);
  const { k, r, cosines } = spring;
  const moved = joined([alongAxis(cosines.x, ux.symbol), alongAxis(cosines.y, uy.symbol)]);
  const { force } = context.units;
  const direct = steps.add(`${symbol}_direct`, `${k.symbol}·(${moved})`, [k, ux, uy, ...cosineValues(cosines)], force, {
    what: `direct part of line ${line.line.id}`,
    clause: 'force = stiffness × displacement along the line',
  });
  const torsional = steps.add(`${symbol}_torsion`, `${k.symbol}·${r.symbol}·${turn.symbol}`, [k, r, turn], force, {
    what: `torsional part of line ${line.line.id}`,
    clause: 'force = stiffness × arm × rotation',
  });
  return steps.add(symbol, `${direct.symbol} + ${torsional.symbol}`, [direct, torsional], force, {
    what: `force of line ${line.line.id} in the storey below, along its axis`,
  });
}

/** What a wall line brings to the body that holds it: the shear of the storey above, and what flexible diaphragms beside give to it. */
function arrives(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  line: LineModel,
  { diaphragm }: DiaphragmOutcome,
  set: ForceSet,
  steps: Steps,
  torsion: Torsion,
): Value[] {
  const values: Value[] = [];
  const above = context.model.levels[diaphragm.level + 1];
  if (above !== undefined && line.storeys[above.index] !== undefined) {
    const shear = fromDemand(context, `V_above_${line.index + 1}`, of, `${line.line.id}/${above.id}`, 'shear');
    if (shear !== undefined) {
      const own = torsion === 'amplified' ? shear : beforeAmplification(context, of, line, above.index, shear);
      values.push(set === 'force' ? own : raisedShear(context, of, diaphragm.level, line, own, steps));
    }
  }
  for (const beside of runOf(context, of.case).outcomes[diaphragm.level]?.diaphragms ?? []) {
    if (beside.rigid !== undefined || !beside.given.has(line)) continue;
    const force = flexibleGives(context, of, beside, line, steps, steps.fresh('R_d'));
    if (force !== undefined) values.push(force);
  }
  return values;
}

/** A wall's shear from above before any level's torsion was amplified: no demand of the table where it differs. */
function beforeAmplification(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  line: LineModel,
  level: number,
  shear: Value,
): Value {
  const run = runOf(context, of.case);
  const plain = ((run.plain ?? run).outcomes[level]?.below[line.index]?.[0] ?? 0) * of.sense;
  if (plain === shear.value) return shear;
  const what = 'shear of the storey above with the accidental eccentricity as stated';
  return readOff(context, shear.symbol, linePath(line), plain, shear.unit, what);
}

/** Where the level's force acts across the load: where it lies, moved by the accidental eccentricity. */
export function placeOfPush(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  steps: Steps,
  torsion: Torsion = 'amplified',
): Value {
  const { diaphragm, pushed } = outcome;
  const { inertia } = pushed;
  const profile = diaphragm.profiles[inertia.frame] as Profile;
  const { s } = profile.frame;
  const outline = `${diaphragm.path}.outline`;
  const { length } = context.units;
  const centre = inertia.centre - inertia.offset;
  let place: Value;
  if (Math.abs(dot(diaphragm.mass.centre, s) - centre) <= 1e-9 * context.model.extent) {
    place = acrossValue(
      context,
      centreOf(context, of, outcome, 'mass'),
      s,
      steps,
      's_M',
      'centre of mass across the load',
    );
  } else place = readOff(context, 's_M', outline, centre, length, 'centre of the load across it');
  if (inertia.offset === 0) return place;
  const { subCase, amplification } = runOf(context, of.case);
  const path = casePath(context, of.case);
  const accidental = subCase.loadCase.accidental !== undefined;
  const ratio = accidental
    ? fromFile(context, 'ε', `${path}.accidental.ratio`, '1')
    : readOff(context, 'ε', path, Math.abs(subCase.eccentricity), '1', 'eccentricity of wind over the width');
  const width = readOff(context, 'B', outline, profile.to - profile.from, length, 'width across the load');
  const sign = subCase.eccentricity < 0 ? '−' : '+';
  const amplified =
    amplification(diaphragm.level) === 1 || torsion === 'plain'
      ? undefined
      : fromDemand(context, 'A_x', of, bodyMember(context, outcome), 'torsional-amplification');
  const by = amplified === undefined ? 'ε·B' : 'A_x·ε·B';
  return steps.add(
    's_F',
    `${place.symbol} ${sign} ${by}`,
    [place, ratio, width, ...(amplified === undefined ? [] : [amplified])],
    length,
    {
      what: 'place of the level’s force across the load',
      clause: accidental ? 'accidental eccentricity: ASCE 7-16 12.8.4.2, 12.8.4.3' : 'ASCE 7-16 Fig. 27.3-8, case 2',
    },
  );
}

/** A point of the plan across the load. */
function acrossValue(
  context: Context,
  { x, y }: { readonly x: Value; readonly y: Value },
  s: readonly [number, number],
  steps: Steps,
  symbol: string,
  what: string,
): Value {
  const { length } = context.units;
  if (s[1] === 0) return steps.add(symbol, s[0] > 0 ? x.symbol : `−${x.symbol}`, [x], length, { what });
  if (s[0] === 0) return steps.add(symbol, s[1] > 0 ? y.symbol : `−${y.symbol}`, [y], length, { what });
  const cosines = [
    readOff(context, 'c_x', 'loadCases', s[0], '1', 'direction across the load'),
    readOff(context, 'c_y', 'loadCases', s[1], '1', 'direction across the load'),
  ];
  return steps.add(symbol, `c_x·${x.symbol} + c_y·${y.symbol}`, [...cosines, x, y], length, { what });
}
