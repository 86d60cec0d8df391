/** Workings of a pier's deflection and of the stiffness that follows from it, term by term. */
import type { Demand } from '../path/result.js';
import { anchorStiffness, deflectionStiffness as stiffnessOf, pierDeflection } from '../walls/pier-deflection.js';
import { fromDemand, fromFile, pierPath, readOff, type Context } from './context.js';
import { pierPlace, type PierPlace } from './members.js';
import { storeyHeight } from './piers.js';
import { sumOf, type Steps, type Value } from './steps.js';

const THREE = 'SDPWS-2015 Eq. 4.3-1';
const FOUR = 'SDPWS-2015 C4.3.2-1';

export function pierDeflectionWorking(context: Context, demand: Demand, steps: Steps): void {
  const place = pierPlace(context, demand.member);
  const v = fromDemand(context, 'v', demand, demand.member, 'unit-shear');
  const shear = fromDemand(context, 'V', demand, demand.member, 'shear');
  if (v === undefined || shear === undefined) throw new Error(`no shear of ${demand.member}`);
  const terms = deflectionTerms(context, place, v, shear.value, steps);
  steps.add('δ', sumOf(terms), terms, demand.unit, { clause: place.pier.wall?.nailed === undefined ? THREE : FOUR });
}

/** Shear per deflection: the same terms under a unit shear of 1, or the secant of the four-term deflection. */
export function deflectionStiffness(context: Context, place: PierPlace, symbol: string, steps: Steps): Value {
  const { pier, line } = place;
  const { perLength, length } = context.units;
  const what = `stiffness of pier ${pier.key}`;
  if (pier.deflecting !== undefined && pier.deflecting.wall.nailed !== undefined) {
    const value = stiffnessOf(pier.deflecting) ?? NaN;
    return readOff(
      context,
      symbol,
      pierPath(line, pier),
      value,
      perLength,
      `${what}: secant of its four-term deflection at 1.4 times the allowable unit shear`,
    );
  }
  const suffix = symbol.replace(/^k/, '');
  const one = steps.add(steps.fresh(`v${suffix}`), '1', [], perLength, { what: 'a unit shear of 1' });
  const b = pierWidth(context, place, steps.fresh(`b${suffix}`), steps);
  const terms = deflectionTerms(context, place, one, pier.length, steps, suffix);
  const whole = steps.add(steps.fresh(`δ${suffix}`), sumOf(terms), terms, length, { clause: THREE });
  return steps.add(symbol, `${one.symbol}·${b.symbol}/${whole.symbol}`, [one, b, whole], perLength, { what });
}

/** G_a stated, or that of the published assembly. */
export function shearStiffness(context: Context, { pier }: PierPlace): Value {
  const index = context.building.assemblies?.walls?.findIndex((wall) => wall.id === pier.pier.assembly) ?? -1;
  const path = `assemblies.walls[${index}]`;
  const { perLength } = context.units;
  const assembly = pier.wall?.assembly;
  if (assembly?.apparentShearStiffness !== undefined) {
    return fromFile(context, 'G_a', `${path}.apparentShearStiffness`, perLength);
  }
  const what =
    assembly?.published === undefined
      ? 'SDPWS commentary C4.2.2-3, at 1.4 v_allowable'
      : `${assembly.published}, SDPWS-2015 Table 4.3A`;
  return readOff(context, 'G_a', path, pier.wall?.shearStiffness ?? NaN, perLength, what);
}

function pierWidth(context: Context, { line, pier }: PierPlace, symbol: string, steps: Steps): Value {
  const path = pierPath(line, pier);
  const { length } = context.units;
  const from = fromFile(context, 'x_from', `${path}.from`, length);
  const to = fromFile(context, 'x_to', `${path}.to`, length);
  return steps.add(symbol, 'x_to − x_from', [to, from], length, { what: `length of pier ${pier.key}` });
}

/** Bending, shear, slip of nails and rotation, each where the assembly has it [length] */
function deflectionTerms(
  context: Context,
  place: PierPlace,
  v: Value,
  shear: number,
  steps: Steps,
  suffix = '',
): Value[] {
  const { pier, storey } = place;
  const { length, force, perLength } = context.units;
  const wall = pier.wall;
  if (wall === undefined || pier.deflecting === undefined) throw new Error(`no deflection of ${pier.key}`);
  const index = context.building.assemblies?.walls?.findIndex((each) => each.id === pier.pier.assembly) ?? -1;
  const path = `assemblies.walls[${index}]`;
  const b = pierWidth(context, place, steps.fresh(`b${suffix}`), steps);
  const h = steps.add(steps.fresh(`h${suffix}`), 'z_top − z_foot', storeyHeight(context, storey.level), length);
  const clause = wall.nailed === undefined ? THREE : FOUR;
  const add = (name: string, formula: string, values: readonly Value[], what: string): Value =>
    steps.add(steps.fresh(`${name}${suffix}`), formula, values, length, { what, clause });
  const terms: Value[] = [];
  if (wall.assembly.endPostStiffness !== undefined) {
    const stiffness = fromFile(context, 'EA', `${path}.endPostStiffness`, force);
    const formula = `2·${v.symbol}·${h.symbol}^3/(3·EA·${b.symbol})`;
    terms.push(add('δ_b', formula, [v, h, b, stiffness], 'bending, 8vh³/(EAb) in feet and inches'));
  }
  if (wall.nailed === undefined) {
    const stiffness = shearStiffness(context, place);
    terms.push(add('δ_s', `${v.symbol}·${h.symbol}/G_a`, [v, h, stiffness], 'shear, vh/(1000 G_a) in feet and inches'));
  } else {
    const rigidity = fromFile(context, 'G_v_t_v', `${path}.fourTerm.panelRigidity`, perLength);
    terms.push(add('δ_s', `${v.symbol}·${h.symbol}/G_v_t_v`, [v, h, rigidity], 'shear of the panel'));
    const slip = pierDeflection(pier.deflecting, shear)?.nailSlip ?? NaN;
    const what = '0.75·h·e_n, slip of the nails at this unit shear (SDPWS commentary C4.2.2)';
    terms.push(readOff(context, steps.fresh(`δ_n${suffix}`), `${path}.fourTerm`, slip, length, what));
  }
  if (Number.isFinite(anchorStiffness(pier.holdDown))) {
    const hold = context.building.assemblies?.holdDowns?.findIndex((each) => each.id === pier.pier.holdDown) ?? -1;
    const values = [
      fromFile(context, 'Δ_all', `assemblies.holdDowns[${hold}].deflectionAtAllowable`, length),
      fromFile(context, 'T_all', `assemblies.holdDowns[${hold}].allowableTension`, force),
    ];
    const formula = `${h.symbol}/${b.symbol}·(${v.symbol}·${h.symbol}·Δ_all/T_all)`;
    terms.push(add('δ_a', formula, [h, b, v, ...values], `rotation on the hold-downs`));
  }
  return terms;
}
