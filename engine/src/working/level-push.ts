/** The level's own force as a working takes it up: its size from the level's demand, its direction from the load case. */
import type { Demand } from '../path/result.js';
import { fromDemand, runOf, type Context } from './context.js';
import type { Steps, Value } from './steps.js';

/** Which of the two sets of forces that run side by side. */
export type ForceSet = 'force' | 'diaphragm-force';

/**
 * The level's force along a direction that runs with the load or against it.
 *
 * @param along sign of the direction against the frame's t of the load
 */
export function pushStep(
  context: Context,
  of: Pick<Demand, 'case' | 'sense'>,
  level: string,
  set: ForceSet,
  along: number,
  steps: Steps,
  symbol = 'F',
): Value {
  const { subCase } = runOf(context, of.case);
  const index = context.model.levels.find((candidate) => candidate.id === level)?.index ?? 0;
  const force = (set === 'force' ? subCase.storeyForce : subCase.diaphragmForce)[index] ?? 0;
  const size = fromDemand(context, 'F_level', of, level, set);
  if (size === undefined) throw new Error(`no ${set} of level ${level} under ${of.case}`);
  const against = force * subCase.sign * of.sense * along < 0;
  return steps.add(symbol, against ? '−F_level' : 'F_level', [size], context.units.force, {
    what: `${set === 'force' ? 'storey force' : 'diaphragm design force'} of level ${level}, positive along the direction that counts here`,
  });
}
