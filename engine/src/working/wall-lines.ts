/** Workings of wall lines: reaction, accumulated shear, overturning moment. */
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { bodyShear } from './body-shear.js';
import { addedUp } from './combined.js';
import { carriedCase, fromDemand, runOf, type Context } from './context.js';
import { flexibleGives } from './flexible-reaction.js';
import { storeyPlace, type StoreyPlace } from './members.js';
import { storeyHeight } from './piers.js';
import { sumOf, type Steps, type Value } from './steps.js';

export function lineShear(context: Context, demand: Demand, steps: Steps): void {
  if (addedUp(context, demand, 'V', steps)) return;
  const place = storeyPlace(context, demand.member);
  const body = bodyHolding(context, demand, place);
  if (body !== undefined) {
    bodyShear(context, demand, place, body, steps);
    return;
  }
  const reaction = fromDemand(context, 'R', demand, demand.member, 'reaction');
  const values = [...aboveShear(context, demand, place), ...(reaction === undefined ? [] : [reaction])];
  steps.add('V', sumOf(values), values, demand.unit, { clause: 'equilibrium of the wall line' });
}

export function lineReaction(context: Context, demand: Demand, steps: Steps): void {
  if (addedUp(context, demand, 'R', steps)) return;
  const place = storeyPlace(context, demand.member);
  if (bodyHolding(context, demand, place) !== undefined) {
    const shear = fromDemand(context, 'V', demand, demand.member, 'shear');
    const [above] = aboveShear(context, demand, place);
    if (shear === undefined) throw new Error(`no shear of ${demand.member}`);
    const values = above === undefined ? [shear] : [shear, above];
    steps.add('R', above === undefined ? 'V' : 'V − V_above', values, demand.unit, {
      clause: 'equilibrium of the wall line',
    });
    return;
  }
  const parts: Value[] = [];
  for (const outcome of runOf(context, demand.case).outcomes[place.storey.level]?.diaphragms ?? []) {
    if (outcome.rigid !== undefined) continue;
    const force = flexibleGives(context, demand, outcome, place.line, steps, steps.fresh('R_d'));
    if (force !== undefined) parts.push(force);
  }
  steps.add('R', sumOf(parts), parts, demand.unit, { clause: 'equilibrium of the wall line' });
}

export function lineOverturning(context: Context, demand: Demand, steps: Steps): void {
  const place = storeyPlace(context, demand.member);
  const upper = context.model.levels
    .slice(place.storey.level + 1)
    .find((level) => place.line.storeys[level.index] !== undefined);
  const shear = fromDemand(context, 'V', demand, demand.member, 'shear');
  // The moments add up with their signs; the rows of the table are magnitudes.
  const above = upper === undefined ? undefined : signedMoment(context, demand, place, upper.index);
  const values = [
    ...(above === undefined ? [] : above.values),
    ...(shear === undefined ? [] : [shear, ...storeyHeight(context, place.storey.level)]),
  ];
  const terms = [...(above === undefined ? [] : [above.text]), ...(shear === undefined ? [] : ['V·(z_top − z_foot)'])];
  steps.add('M', terms.length === 0 ? '0' : `abs(${terms.join(' + ')})`, values, demand.unit, {
    clause: 'statics of a cantilever wall',
  });
}

function signedMoment(
  context: Context,
  demand: Demand,
  { line }: StoreyPlace,
  level: number,
): { text: string; values: Value[] } | undefined {
  const id = context.model.levels[level]?.id ?? '';
  const moment = fromDemand(context, 'M_above', demand, `${line.line.id}/${id}`, 'overturning-moment');
  if (moment === undefined) return undefined;
  let sum = 0;
  for (const storey of line.storeys.slice(level)) {
    const height = storey === undefined ? 0 : (context.model.levels[storey.level]?.height ?? 0);
    const shear = carriedCase(context, demand.case)?.outcomes[storey?.level ?? 0]?.below[line.index]?.[0] ?? 0;
    sum += shear * height * demand.sense;
  }
  return { text: sum < 0 ? '−M_above' : 'M_above', values: [moment] };
}

/** The shear that comes down from the storey above. */
export function aboveShear(context: Context, demand: Demand, { line, storey }: StoreyPlace): Value[] {
  if (line.storeys[storey.level + 1] === undefined) return [];
  const level = context.model.levels[storey.level + 1];
  const shear = fromDemand(context, 'V_above', demand, `${line.line.id}/${level?.id ?? ''}`, 'shear');
  return shear === undefined ? [] : [shear];
}

/** The rigid or semi-rigid diaphragm that holds a line at a level. */
function bodyHolding(context: Context, demand: Demand, { line, storey }: StoreyPlace): DiaphragmOutcome | undefined {
  return runOf(context, demand.case).outcomes[storey.level]?.diaphragms.find(
    (outcome) => outcome.rigid !== undefined && outcome.given.has(line),
  );
}
