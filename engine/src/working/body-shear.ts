/** What a rigid or semi-rigid diaphragm gives to a wall line. */
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import type { StoreyPlace } from './members.js';
import type { Context } from './context.js';
import { membraneShear } from './membrane-shear.js';
import { rigidBody, rigidShear } from './rigid-body.js';
import type { Steps } from './steps.js';

export function bodyShear(
  context: Context,
  demand: Demand,
  place: StoreyPlace,
  outcome: DiaphragmOutcome,
  steps: Steps,
): void {
  if (outcome.rigid?.model.semiRigid !== undefined) membraneShear(context, demand, place, outcome, steps);
  else {
    const body = rigidBody(context, demand, outcome, 'force', steps);
    rigidShear(body, place.line, 'V');
  }
}
