/** Workings of piers: their part of the line's shear, and their unit shear. */
import type { Demand } from '../path/result.js';
import { fromDemand, fromFile, fromFileOr, linePath, pierPath, type Context } from './context.js';
import { pierPlace, type PierPlace } from './members.js';
import { deflectionStiffness, shearStiffness } from './pier-deflection.js';
import { sumOf, type Steps, type Value } from './steps.js';

export function pierShear(context: Context, demand: Demand, steps: Steps): void {
  const place = pierPlace(context, demand.member);
  const line = fromDemand(context, 'V_line', demand, `${place.line.line.id}/${place.level}`, 'shear');
  if (line === undefined) throw new Error(`no shear of the line of ${demand.member}`);
  const share = pierShare(context, place, steps);
  steps.add('V', `V_line·${share.symbol}`, [line, share], demand.unit, { clause: 'equilibrium of the wall line' });
}

export function pierUnitShear(context: Context, demand: Demand, steps: Steps): void {
  const { line, pier } = pierPlace(context, demand.member);
  const shear = fromDemand(context, 'V', demand, demand.member, 'shear');
  if (shear === undefined) throw new Error(`no shear of ${demand.member}`);
  const path = pierPath(line, pier);
  const { length } = context.units;
  steps.add(
    'v',
    'abs(V)/(x_to − x_from)',
    [shear, fromFile(context, 'x_to', `${path}.to`, length), fromFile(context, 'x_from', `${path}.from`, length)],
    demand.unit,
    { clause: 'shear even over the pier’s length' },
  );
}

/** A pier's part of its line: by length, or by stiffness. */
export function pierShare(context: Context, place: PierPlace, steps: Steps): Value {
  const { line, storey, pier } = place;
  const parts = storey.piers.map((each, i) => {
    const stiff = (line.line.shareBy ?? 'length') !== 'length' && storey.stated;
    return stiff
      ? pierStiffness(context, { ...place, pier: each }, steps.fresh(`k_${i + 1}`), steps)
      : pierLength(context, { ...place, pier: each }, steps.fresh(`b_${i + 1}`), steps);
  });
  const own = parts[storey.piers.indexOf(pier)] as Value;
  return steps.add(steps.fresh('c'), `${own.symbol}/(${sumOf(parts)})`, parts, '1', {
    what: `part of line ${line.line.id} that goes to pier ${pier.pier.id}`,
    clause: `${linePath(line)}.shareBy: ${line.line.shareBy ?? 'length'}`,
  });
}

export function pierLength(context: Context, { line, pier }: PierPlace, symbol: string, steps: Steps): Value {
  const path = pierPath(line, pier);
  const { length } = context.units;
  const from = fromFile(context, 'x_from', `${path}.from`, length);
  const to = fromFile(context, 'x_to', `${path}.to`, length);
  return steps.add(symbol, 'x_to − x_from', [to, from], length, { what: `length of pier ${pier.key}` });
}

/** Stated, by the whole deflection where the line shares by it, or that of a wall which deforms in shear alone. */
export function pierStiffness(context: Context, place: PierPlace, symbol: string, steps: Steps): Value {
  const { line, pier, storey } = place;
  const path = pierPath(line, pier);
  const { length, perLength } = context.units;
  const what = `stiffness of pier ${pier.key}`;
  if (pier.pier.stiffness !== undefined) return fromFile(context, symbol, `${path}.stiffness`, perLength, what);
  if (line.line.shareBy === 'deflection') return deflectionStiffness(context, place, symbol, steps);
  return steps.add(
    symbol,
    'G_a·(x_to − x_from)/(z_top − z_foot)',
    [
      shearStiffness(context, place),
      fromFile(context, 'x_to', `${path}.to`, length),
      fromFile(context, 'x_from', `${path}.from`, length),
      ...storeyHeight(context, storey.level),
    ],
    perLength,
    { what, clause: 'a wall that deforms in shear alone' },
  );
}

/** Elevations of a storey's top and foot. */
export function storeyHeight(context: Context, level: number): readonly [Value, Value] {
  return [levelValue(context, 'z_top', level), levelValue(context, 'z_foot', level - 1)];
}

function levelValue(context: Context, symbol: string, index: number): Value {
  const level = context.model.levels[index];
  const place = context.building.levels.findIndex((candidate) => candidate.id === level?.id);
  return fromFile(context, symbol, `levels[${place}].elevation`, context.units.length);
}

/** Distance of the end posts from the pier's ends. */
export function endOffsets(
  context: Context,
  { line, pier }: Pick<PierPlace, 'line' | 'pier'>,
): readonly [Value, Value] {
  const path = `${pierPath(line, pier)}.endOffset`;
  const { length } = context.units;
  if (Array.isArray(pier.pier.endOffset)) {
    return [fromFile(context, 'o_from', `${path}[0]`, length), fromFile(context, 'o_to', `${path}[1]`, length)];
  }
  return [fromFileOr(context, 'o_from', path, 0, length), fromFileOr(context, 'o_to', path, 0, length)];
}
