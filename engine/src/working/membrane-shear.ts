/**
 * What a semi-rigid diaphragm gives to a wall line. Its displacements come from a system of thousands of equations, which no one sums up
 * by hand: the working says which system it is, shows the line's own law, and gives the sum that a checker can verify.
 */
import { dot } from '../geometry/frame.js';
import type { Profile } from '../geometry/profile.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { fromDemand, readOff, type Context } from './context.js';
import { pushStep } from './level-push.js';
import type { StoreyPlace } from './members.js';
import { stiffnessStep } from './plan-arms.js';
import type { Steps, Value } from './steps.js';

export function membraneShear(
  context: Context,
  demand: Demand,
  { line, storey }: StoreyPlace,
  outcome: DiaphragmOutcome,
  steps: Steps,
): void {
  const model = outcome.rigid?.model;
  const membrane = model?.semiRigid?.model;
  if (model === undefined || membrane === undefined) throw new Error(`${outcome.diaphragm.key} is no membrane`);
  levelCloses(context, demand, outcome, steps);
  const k = stiffnessStep(context, storey, model.absolute, steps, 'line');
  const given = (outcome.given.get(line)?.[0] ?? 0) * demand.sense;
  const unknowns = 2 * membrane.mesh.x.length;
  const moved = readOff(
    context,
    'u',
    outcome.diaphragm.path,
    given / k.value,
    context.units.length,
    `mean displacement of the floor along line ${line.line.id}: from the solution of K·u = F of its membrane elements on the wall lines’ springs, ${unknowns} unknowns`,
  );
  steps.add('V', `${k.symbol}·u`, [k, moved], demand.unit, {
    what: `force of line ${line.line.id} in the storey below, along its axis`,
    clause: 'force = stiffness × displacement; plane-stress membrane elements, K·u = F',
  });
}

/** Equilibrium of the level along the load: what the walls below take, less what those above bring, less the level's force. */
function levelCloses(context: Context, demand: Demand, outcome: DiaphragmOutcome, steps: Steps): void {
  const { diaphragm, pushed } = outcome;
  const level = context.model.levels[diaphragm.level];
  if (level === undefined || level.diaphragms.length > 1) return;
  const above = context.model.levels[level.index + 1];
  const { t } = (diaphragm.profiles[pushed.inertia.frame] as Profile).frame;
  const terms: string[] = [];
  const values: Value[] = [];
  const take = (shear: Value | undefined, cosine: number, sign: 1 | -1, path: string): void => {
    if (shear === undefined || Math.abs(cosine) < 1e-12) return;
    const positive = cosine * sign > 0;
    values.push(shear);
    if (Math.abs(Math.abs(cosine) - 1) < 1e-12) terms.push(`${positive ? '+' : '−'} ${shear.symbol}`);
    else {
      const c = readOff(context, `c_${shear.symbol}`, path, Math.abs(cosine), '1', 'cosine against the load');
      values.push(c);
      terms.push(`${positive ? '+' : '−'} ${shear.symbol}·${c.symbol}`);
    }
  };
  for (const line of context.model.lines) {
    const cosine = dot(line.along, t);
    const path = `wallLines[${line.index}].axis`;
    const n = line.index + 1;
    if (outcome.given.has(line)) {
      take(fromDemand(context, `V_${n}`, demand, `${line.line.id}/${level.id}`, 'shear'), cosine, 1, path);
    }
    if (above !== undefined && outcome.taken.has(line) && line.storeys[above.index] !== undefined) {
      take(fromDemand(context, `V_above_${n}`, demand, `${line.line.id}/${above.id}`, 'shear'), cosine, -1, path);
    }
  }
  const force = pushStep(context, demand, level.id, 'force', 1, steps);
  const sum = terms.join(' ').replace(/^\+ /, '').replace(/^− /, '−');
  steps.add('check', `${sum === '' ? '0' : sum} − F`, [...values, force], context.units.force, {
    what: `check of level ${level.id}: walls below, less walls above, less the level’s force, along the load; closes to 0`,
    clause: 'equilibrium of the level',
  });
}
