/** Workings of what end posts carry: tension and compression of piers, uplift, bearing, shear and moment of supports. */
import type { Demand } from '../path/result.js';
import { factorsOf, type Factors } from './combination.js';
import { fromDemand, type Context } from './context.js';
import { footOf, postPlace, type PostPlace } from './members.js';
import { armOf, postForce, postSteps, type Cause, type PostSteps } from './posts.js';
import type { Steps, Value } from './steps.js';

export function endTension(context: Context, demand: Demand, steps: Steps): void {
  const [near, far] = bothEnds(postSteps(context, steps), demand, demand.member);
  steps.add('T', 'max(0, −N_from, −N_to)', [near, far], demand.unit, { what: 'the larger tension of both posts' });
}

export function endCompression(context: Context, demand: Demand, steps: Steps): void {
  const [near, far] = bothEnds(postSteps(context, steps), demand, demand.member);
  steps.add('C_max', 'max(0, N_from, N_to)', [near, far], demand.unit, {
    what: 'the larger compression of both posts',
  });
}

export function supportUplift(context: Context, demand: Demand, steps: Steps): void {
  const force = atSupport(context, demand, steps);
  steps.add('U', 'max(0, −N)', [force], demand.unit, { what: 'uplift' });
}

export function supportBearing(context: Context, demand: Demand, steps: Steps): void {
  const force = atSupport(context, demand, steps);
  steps.add('B', 'max(0, N)', [force], demand.unit, { what: 'bearing' });
}

export function supportShear(context: Context, demand: Demand, steps: Steps): void {
  const shear = fromDemand(context, 'V', demand, pierOfSupport(context, demand.member), 'shear');
  if (shear === undefined) {
    steps.add('H', '0', [], demand.unit, { what: 'the pier above has no shear' });
    return;
  }
  if (demand.combination === undefined) {
    steps.add('H', 'abs(V)', [shear], demand.unit, { clause: 'equilibrium of the pier' });
    return;
  }
  const { lateral } = factorsOf(context, demand.case, demand.combination, steps);
  if (lateral === undefined) throw new Error(`no lateral factor in ${demand.combination}`);
  steps.add('H', `abs(${lateral.symbol}·V)`, [lateral, shear], demand.unit, { clause: 'equilibrium of the pier' });
}

export function supportMoment(context: Context, demand: Demand, steps: Steps): void {
  const made = postSteps(context, steps);
  const pier = pierOfSupport(context, demand.member);
  const [near, far] = bothEnds(made, demand, pier);
  const arm = armOf(made, footOf(context, pier));
  steps.add('M', `abs(N_to − N_from)/2·${arm.symbol}`, [near, far, arm], demand.unit, {
    clause: 'couple of the two posts about the middle of the pier',
  });
}

/** `line/pier` at the base is pier `line/under/pier` of the lowest storey. */
function pierOfSupport(context: Context, member: string): string {
  const [line, pier] = member.split('/');
  return `${line ?? ''}/${context.model.levels[1]?.id ?? ''}/${pier ?? ''}`;
}

function bothEnds(made: PostSteps, demand: Demand, pier: string): readonly [Value, Value] {
  const factors = factorsFor(made, demand);
  const foot = footOf(made.context, pier);
  return [
    combined(made, { foot, end: 'from' }, demand, factors, 'N_from'),
    combined(made, { foot, end: 'to' }, demand, factors, 'N_to'),
  ];
}

/** A support is the foot of a post in the lowest storey, `line/pier/from`, or of one carried down, `line/under/pier/from`. */
function atSupport(context: Context, demand: Demand, steps: Steps): Value {
  const made = postSteps(context, steps);
  const parts = demand.member.split('/');
  const key = parts.length === 4 ? demand.member : `${pierOfSupport(context, demand.member)}/${parts[2] ?? ''}`;
  return combined(made, postPlace(context, key), demand, factorsFor(made, demand), 'N');
}

function factorsFor({ context, steps }: PostSteps, demand: Demand): Factors | undefined {
  return demand.combination === undefined ? undefined : factorsOf(context, demand.case, demand.combination, steps);
}

/** The post's compression with the demand's combination, or of its component alone. */
function combined(
  made: PostSteps,
  place: PostPlace,
  demand: Demand,
  factors: Factors | undefined,
  symbol: string,
): Value {
  const terms: string[] = [];
  const values: Value[] = [];
  const take = (cause: Cause, factor: Value | undefined): void => {
    const force = component(made, place, cause, demand);
    if (force === undefined) return;
    terms.push(factor === undefined ? force.text : `${factor.symbol}·${force.text}`);
    values.push(...(factor === undefined ? [] : [factor]), ...force.values);
  };
  const gravity = (['D', 'L', 'Lr', 'S'] as const).find((name) => name === demand.case);
  const lateral: Cause = { case: demand.case, sense: demand.sense };
  if (factors === undefined) take(gravity === undefined ? lateral : { gravity }, undefined);
  else {
    if (factors.lateral !== undefined) take(lateral, factors.lateral);
    for (const [name, factor] of factors.gravity) take({ gravity: name }, factor);
  }
  return made.steps.add(symbol, terms.length === 0 ? '0' : terms.join(' + '), values, made.context.units.force, {
    what: `compression at the foot of ${place.foot.pier.key}/${place.end}`,
    clause: demand.combination,
  });
}

type Term = { readonly text: string; readonly values: readonly Value[] };

/** The post's compression from one cause: by the rows of its support where it has one and this is another row, else by its steps. */
function component(made: PostSteps, place: PostPlace, cause: Cause, demand: Demand): Term | undefined {
  const { context } = made;
  const { foot, end } = place;
  const carried = demand.kind === 'support' && demand.member.split('/').length === 4;
  const support = foot.storey.level === 1 ? `${foot.line.line.id}/${foot.pier.pier.id}/${end}` : demand.member;
  const hasRows = carried || foot.storey.level === 1;
  if (!hasRows || (demand.member === support && demand.combination === undefined)) {
    const force = postForce(made, place, cause);
    return force === undefined ? undefined : { text: force.symbol, values: [force] };
  }
  const of = cause.gravity === undefined ? cause : { case: cause.gravity, sense: 1 as const };
  const tag = `${cause.gravity ?? 'E'}_${end}`;
  const bearing = fromDemand(context, `B_${tag}`, of, support, 'bearing');
  const uplift = fromDemand(context, `U_${tag}`, of, support, 'uplift');
  if (bearing === undefined || uplift === undefined) return undefined;
  if (uplift.value === 0) return { text: bearing.symbol, values: [bearing] };
  if (bearing.value === 0) return { text: `(−${uplift.symbol})`, values: [uplift] };
  throw new Error(`${support} is pulled and pushed at once`);
}
