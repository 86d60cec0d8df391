/** Workings of a level's storey shear and overturning, and of the motion of diaphragms that move as one body. */
import { edgeDrifts } from '../path/level-demands.js';
import type { Demand, Quantity } from '../path/result.js';
import { semiRigidMotion, largestBow } from '../path/semi-rigid-motion.js';
import type { Profile } from '../geometry/profile.js';
import { bodyMember, bodyOf } from './body-member.js';
import { elevationOf, fromDemand, levelOf, readOff, runOf, type Context } from './context.js';
import { resultantSteps, rigidBody } from './rigid-body.js';
import type { Steps, Value } from './steps.js';

export function storeyShear(context: Context, demand: Demand, steps: Steps): void {
  const { index, id } = levelOf(context, demand.member);
  const above = context.model.levels[index + 1];
  const values = [
    ...signed(context, demand, 'V_above', above?.id, 'storey-shear', sumAbove(context, demand, index + 1)),
    ...signed(context, demand, 'F', id, 'force', forceAt(context, demand, index)),
  ];
  steps.add(
    'V',
    `abs(${expression(values)})`,
    values.map(({ value }) => value),
    demand.unit,
    {
      clause: 'equilibrium of everything above',
    },
  );
}

export function levelOverturning(context: Context, demand: Demand, steps: Steps): void {
  const { index, id } = levelOf(context, demand.member);
  const above = context.model.levels[index + 1];
  const below = context.model.levels[index - 1];
  let moment = 0;
  for (const level of context.model.levels.slice(index + 1))
    moment += sumAbove(context, demand, level.index) * level.height;
  const values = [
    ...signed(context, demand, 'M_above', above?.id, 'overturning-moment', moment),
    ...signed(context, demand, 'V', id, 'storey-shear', sumAbove(context, demand, index)),
  ];
  const terms = values.map((each) =>
    each.value.symbol === 'V' ? { ...each, text: `${each.text}·(z_top − z_foot)` } : each,
  );
  steps.add(
    'M',
    `abs(${expression(terms)})`,
    [
      ...values.map(({ value }) => value),
      elevationOf(context, 'z_top', id),
      elevationOf(context, 'z_foot', below?.id ?? id),
    ],
    demand.unit,
    {
      what: `at the foot of the storey under ${id}`,
      clause: 'statics',
    },
  );
}

/** A magnitude of the table with the sign that it has among the others. */
type Signed = { readonly value: Value; readonly text: string; readonly negative: boolean };

function signed(
  context: Context,
  demand: Demand,
  symbol: string,
  member: string | undefined,
  quantity: Quantity,
  size: number,
): Signed[] {
  const value = member === undefined ? undefined : fromDemand(context, symbol, demand, member, quantity);
  return value === undefined ? [] : [{ value, text: symbol, negative: size < 0 }];
}

function expression(terms: readonly Signed[]): string {
  return (
    terms
      .map(({ text, negative }, i) => `${negative ? (i === 0 ? '−' : '− ') : i === 0 ? '' : '+ '}${text}`)
      .join(' ') || '0'
  );
}

function forceAt(context: Context, demand: Demand, level: number): number {
  return runOf(context, demand.case).subCase.storeyForce[level] ?? 0;
}

function sumAbove(context: Context, demand: Demand, level: number): number {
  return runOf(context, demand.case)
    .subCase.storeyForce.slice(level)
    .reduce((sum, force) => sum + force, 0);
}

export function torsion(context: Context, demand: Demand, steps: Steps): void {
  const outcome = bodyOf(context, demand);
  resultantSteps(context, demand, outcome, 'force', steps);
  const moment = resultantValue(steps);
  steps.add('T_size', 'abs(T)', [moment], demand.unit, { what: 'torsion about the centre of rigidity' });
}

function resultantValue(steps: Steps): Value {
  const step = steps.list.find(({ symbol }) => symbol === 'T');
  if (step === undefined) throw new Error('no resultant');
  return { symbol: 'T', value: step.result, unit: step.unit, from: 'T' };
}

export function drift(context: Context, demand: Demand, steps: Steps): void {
  const outcome = bodyOf(context, demand);
  const { subCase } = runOf(context, demand.case);
  const motion = semiRigidMotion(outcome, subCase.frame);
  if (motion !== undefined) {
    const most = readOff(
      context,
      'u_max',
      outcome.diaphragm.path,
      motion.largest,
      demand.unit,
      solution('largest displacement along the load'),
    );
    steps.add('δ', 'u_max', [most], demand.unit, { clause: 'plane-stress membrane elements, K·u = F' });
    return;
  }
  const [near, far] = edges(context, demand, steps, false);
  steps.add('δ', 'max(abs(δ_A), abs(δ_B))', [near, far], demand.unit, {
    what: 'the larger displacement of both edges',
  });
}

export function torsionalRatio(context: Context, demand: Demand, steps: Steps): void {
  const [near, far] = edges(context, demand, steps, true);
  steps.add('ratio', 'max(abs(δ_A), abs(δ_B))/(abs(δ_A + δ_B)/2)', [near, far], demand.unit, {
    what: 'largest over average, before any amplification',
    clause: 'ASCE 7-16 Table 12.3-1 type 1, 12.8.4.3',
  });
}

export function torsionalAmplification(context: Context, demand: Demand, steps: Steps): void {
  const run = runOf(context, demand.case);
  const { loadCase, amplified } = run.subCase;
  if (!amplified) {
    steps.add('A_x', '1', [], demand.unit, { what: 'the load case asks for no amplification' });
    return;
  }
  const { diaphragm } = bodyOf(context, demand);
  const ratios: Value[] = [];
  let unbounded = false;
  for (const other of context.runs) {
    if (other.subCase.loadCase !== loadCase || other.subCase.eccentricity === 0) continue;
    for (const outcome of other.outcomes[diaphragm.level]?.diaphragms ?? []) {
      if (outcome.rigid === undefined) continue;
      const plain = (other.plain ?? other).outcomes[diaphragm.level]?.diaphragms.find(
        (each) => each.diaphragm === outcome.diaphragm,
      );
      const moved = edgeDrifts(plain ?? outcome, other.subCase);
      if (moved.average === 0 && moved.largest > 0) unbounded = true;
      const of = { case: other.subCase.id, sense: demand.sense };
      const ratio = fromDemand(context, `r_${ratios.length + 1}`, of, bodyMember(context, outcome), 'torsional-ratio');
      if (ratio !== undefined) ratios.push(ratio);
    }
  }
  const terms = ratios.map(({ symbol }) => `(${symbol}/1.2)^2`);
  steps.add('A_x', unbounded ? '3' : `min(3, max(1, ${terms.join(', ')}))`, unbounded ? [] : ratios, demand.unit, {
    what: unbounded
      ? 'the edges move against each other: the upper limit'
      : 'from whichever side is the more severe, between 1 and 3',
    clause: 'ASCE 7-16 Eq. 12.8-14',
  });
}

export function bowDeflection(context: Context, demand: Demand, steps: Steps): void {
  const { deflection, path } = bowOf(context, demand);
  const bow = readOff(
    context,
    'δ_bow',
    path,
    deflection,
    demand.unit,
    solution('largest distance of the floor from the straight line between its wall lines'),
  );
  steps.add('δ', 'δ_bow', [bow], demand.unit, {
    clause: 'ASCE 7-16 Fig. 12.3-1; plane-stress membrane elements, K·u = F',
  });
}

export function bowRatio(context: Context, demand: Demand, steps: Steps): void {
  const { drift: average, path } = bowOf(context, demand);
  const bow = fromDemand(context, 'δ', demand, demand.member, 'deflection');
  if (bow === undefined) throw new Error(`no deflection of ${demand.member}`);
  const walls = readOff(context, 'Δ', path, average, bow.unit, solution('average drift of the two wall lines beside'));
  steps.add('ratio', 'δ/Δ', [bow, walls], demand.unit, { clause: 'ASCE 7-16 12.3.1.3' });
}

function bowOf(context: Context, demand: Demand): { deflection: number; drift: number; path: string } {
  const outcome = bodyOf(context, demand);
  const bow = largestBow(semiRigidMotion(outcome, runOf(context, demand.case).subCase.frame));
  if (bow === undefined) throw new Error(`${demand.member} does not bow`);
  return { deflection: bow.deflection, drift: bow.drift, path: outcome.diaphragm.path };
}

function solution(what: string): string {
  return `${what}: from the solution of K·u = F of the membrane`;
}

/** Displacements of the two edges across the load, along it; with the eccentricity as stated where `plain`. */
function edges(context: Context, demand: Demand, steps: Steps, plain: boolean): readonly [Value, Value] {
  const outcome = bodyOf(context, demand);
  const run = runOf(context, demand.case);
  const { frame } = run.subCase;
  const { length } = context.units;
  const motion = semiRigidMotion(outcome, frame);
  if (motion !== undefined) {
    const before = plain
      ? (run.plain ?? run).outcomes[outcome.diaphragm.level]?.diaphragms.find(
          (each) => each.diaphragm === outcome.diaphragm,
        )
      : outcome;
    const own = before === undefined ? motion : (semiRigidMotion(before, frame) ?? motion);
    const { path } = outcome.diaphragm;
    return [
      readOff(context, 'δ_A', path, own.near * demand.sense, length, solution('mean displacement of the near edge')),
      readOff(context, 'δ_B', path, own.far * demand.sense, length, solution('mean displacement of the far edge')),
    ];
  }
  const { ux, uy, turn, acrossR } = rigidBody(context, demand, outcome, 'force', steps, plain ? 'plain' : 'amplified');
  const profile = outcome.diaphragm.profiles[frame] as Profile;
  const { s, t } = profile.frame;
  const sign = s[0] * t[1] - s[1] * t[0] > 0 ? '+' : '−';
  const parts: string[] = [];
  const values: Value[] = [];
  ([ux, uy] as const).forEach((u, i) => {
    const part = t[i] ?? 0;
    if (part === 0) return;
    values.push(u);
    if (Math.abs(part) === 1) parts.push(`${part > 0 ? '' : '−'}${u.symbol}`);
    else {
      const cosine = readOff(
        context,
        `t_${i === 0 ? 'x' : 'y'}`,
        `${outcome.diaphragm.path}.outline`,
        part,
        '1',
        'direction along the load',
      );
      values.push(cosine);
      parts.push(`${u.symbol}·${cosine.symbol}`);
    }
  });
  const edge = (symbol: string, place: number): Value => {
    const at = readOff(
      context,
      's_edge',
      `${outcome.diaphragm.path}.outline`,
      place,
      length,
      'edge of the outline across the load',
    );
    return steps.add(
      symbol,
      `${parts.join(' + ')} ${sign} ${turn.symbol}·(s_edge − ${acrossR.symbol})`,
      [...values, turn, at, acrossR],
      ux.unit,
      {
        what: 'displacement of an edge along the load',
        clause: 'a rigid body in its plane',
      },
    );
  };
  return [edge('δ_A', profile.from), edge('δ_B', profile.to)];
}
