/** Workings of demand over capacity of piers and hold-downs. */
import { formatFor } from '../loads/combinations.js';
import type { Demand } from '../path/result.js';
import type { Format } from '../walls/capacity.js';
import { pierCapacity, pierSlenderness } from '../walls/pier-capacity.js';
import { factorsOf } from './combination.js';
import { fromDemand, fromFile, fromFileOr, pierPath, readOff, runOf, type Context } from './context.js';
import { pierPlace, type PierPlace } from './members.js';
import { pierLength, storeyHeight } from './piers.js';
import { referenceOf } from './reference.js';
import type { Steps, Value } from './steps.js';

export function pierRatio(context: Context, demand: Demand, steps: Steps): void {
  const place = pierPlace(context, demand.member);
  const { loadCase } = runOf(context, demand.case).subCase;
  const v = fromDemand(context, 'v', demand, demand.member, 'unit-shear');
  if (v === undefined) throw new Error(`no unit shear of ${demand.member}`);
  const format = formatFor(context.building, loadCase) ?? place.pier.wall?.format ?? 'allowable';
  const capacity = designUnitShear(context, place, loadCase.kind, format, steps);
  if (demand.combination === undefined) {
    steps.add('r', 'v/v_design', [v, capacity], demand.unit);
    return;
  }
  const { lateral } = factorsOf(context, demand.case, demand.combination, steps);
  if (lateral === undefined) throw new Error(`no lateral factor in ${demand.combination}`);
  steps.add('r', `abs(${lateral.symbol})·v/v_design`, [lateral, v, capacity], demand.unit);
}

export function holdDownRatio(context: Context, demand: Demand, steps: Steps): void {
  const { pier } = pierPlace(context, demand.member);
  const { member, case: caseId, sense, combination } = demand;
  const from = referenceOf({
    member,
    quantity: 'end-tension',
    case: caseId,
    sense,
    ...(combination === undefined ? {} : { combination }),
  });
  const tension = context.demands.get(from);
  if (tension === undefined) throw new Error(`no end tension of ${member}`);
  const format = formatFor(context.building, runOf(context, caseId).subCase.loadCase) ?? pier.wall?.format;
  const index = context.building.assemblies?.holdDowns?.findIndex((each) => each.id === pier.pier.holdDown) ?? -1;
  const key = format === 'strength' ? 'strengthTension' : 'allowableTension';
  const path = `assemblies.holdDowns[${index}].${key}`;
  steps.add(
    'r',
    'T/T_all',
    [
      { symbol: 'T', value: tension.value, unit: tension.unit, from },
      fromFile(context, 'T_all', path, context.units.force),
    ],
    demand.unit,
    { what: 'the larger end tension over what the hold-down may carry' },
  );
}

/** v_design = v_n by format, species and slenderness. */
function designUnitShear(
  context: Context,
  place: PierPlace,
  hazard: 'seismic' | 'wind',
  format: Format,
  steps: Steps,
): Value {
  const { storey, pier } = place;
  const capacity = pierCapacity(storey, pier, hazard, format);
  if (capacity === undefined) throw new Error(`no capacity of ${pier.key}`);
  const { perLength } = context.units;
  const index = context.building.assemblies?.walls?.findIndex((each) => each.id === pier.pier.assembly) ?? -1;
  const path = `assemblies.walls[${index}]`;
  const stated = pier.wall?.assembly.nominalUnitShear?.[hazard] !== undefined;
  const nominal = stated
    ? fromFile(context, 'v_n', `${path}.nominalUnitShear.${hazard}`, perLength)
    : readOff(
        context,
        'v_n',
        path,
        capacity.nominal,
        perLength,
        `${pier.wall?.assembly.published ?? ''}, SDPWS Table 4.3A`,
      );
  const factor = steps.add('f', formatText(capacity.formatFactor), [], '1', {
    what: `to ${format} unit shears`,
    clause: `${capacity.clause} (from memory)`,
  });
  const gravity = fromFileOr(context, 'G', `${path}.specificGravity`, 0.5, '1');
  const species = steps.add('f_G', 'min(1, 1 − (0.5 − G))', [gravity], '1', { clause: 'SDPWS-2015 Table 4.3A note 3' });
  const values = [nominal, factor, species];
  let formula = 'v_n·f·f_G';
  const slender = pierSlenderness(storey, pier);
  if (slender !== undefined && slender.factor !== 1) {
    const b = pierLength(context, place, 'b', steps);
    const h = steps.add('h', 'z_top − z_foot', storeyHeight(context, storey.level), context.units.length);
    const strength = Math.abs(slender.factor - 2 / slender.ratio) < 1e-12;
    const text = strength ? '2·b/h' : '1.25 − 0.125·h/b';
    values.push(
      steps.add('f_s', text, [h, b], '1', { what: 'slender pier', clause: `${slender.clause} (from memory)` }),
    );
    formula += '·f_s';
  }
  return steps.add('v_design', formula, values, perLength, {
    what: `design unit shear of ${pierPath(place.line, pier)}`,
  });
}

function formatText(factor: number): string {
  if (factor === 1 / 2.8) return '1/2.8';
  return factor === 1 / 2 ? '1/2' : String(factor);
}
