/** Shears from above as the diaphragm design set takes them: raised where the standard raises transfers. */
import type { Demand } from '../path/result.js';
import type { LineModel } from '../walls/wall-line.js';
import { linePath, readOff, type Context } from './context.js';
import { raisedBy } from './design.js';
import type { Steps, Value } from './steps.js';

/** @returns the shear itself where nothing raises it */
export function raisedShear(
  context: Context,
  of: Pick<Demand, 'case'>,
  level: number,
  line: LineModel,
  shear: Value,
  steps: Steps,
): Value {
  const factor = raisedBy(context, of.case, level, line);
  if (factor === 1) return shear;
  const symbol = `T_above_${line.index + 1}`;
  const known = steps.list.find((step) => step.symbol === symbol);
  if (known !== undefined) return { symbol, value: known.result, unit: known.unit, from: symbol };
  const raise = readOff(context, 'Ω', linePath(line), factor, '1', 'Ω_0 where the wall stops, ρ where it goes on');
  return steps.add(symbol, `Ω·${shear.symbol}`, [raise, shear], shear.unit, {
    what: `transfer of line ${line.line.id} as it enters the diaphragm design forces`,
    clause: 'ASCE 7-16 12.10.1.1, 12.3.4.1',
  });
}
