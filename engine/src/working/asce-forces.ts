/** Workings of the equivalent lateral force procedure of ASCE 7-16 and 7-22; its equations from memory, not checked against the document. */
import { baseShear, upperLimit } from '../loads/asce7/equivalent-lateral-force.js';
import type { AsceSeismic } from '../building/basis.js';
import { feetPer, METRES_PER_FOOT } from '../loads/units.js';
import type { Demand } from '../path/result.js';
import { elevationOf, fromDemand, fromFile, fromFileOr, type Context } from './context.js';
import { atPath } from './file-path.js';
import { weightStep } from './mass.js';
import { sumOf, type Steps, type Value } from './steps.js';

/** Steps down to F_x of a level. */
export function asceForce(context: Context, path: string, level: number, steps: Steps): void {
  const { force } = context.units;
  const levels = context.model.levels.slice(1);
  const heights = levels.map((each) => heightFt(context, each.id, `h_${each.index}`, steps));
  const top = heights[heights.length - 1] as Value;
  const { coefficient, k } = coefficientSteps(context, path, top, steps);
  const weights = levels.map((each) => weightStep(context, each.index, steps, `w_${each.index}`));
  const whole = steps.add('W', sumOf(weights), weights, force, { what: 'effective seismic weight' });
  const shear = steps.add('V', 'C_s·W', [coefficient, whole], force, {
    what: 'base shear',
    clause: 'ASCE 7-16 Eq. 12.8-1',
  });
  const own = levels.findIndex((each) => each.index === level);
  const [w, h] = [weights[own] as Value, heights[own] as Value];
  const sum = levels.map((_, i) => `${weights[i]?.symbol ?? ''}·${heights[i]?.symbol ?? ''}^k`).join(' + ');
  const share = steps.add('C_vx', `${w.symbol}·${h.symbol}^k/(${sum})`, [...weights, ...heights, k], '1', {
    what: 'part of the base shear that acts at the level',
    clause: 'ASCE 7-16 Eq. 12.8-12',
  });
  steps.add('F_x', 'C_vx·V', [share, shear], force, { clause: 'ASCE 7-16 Eq. 12.8-11' });
}

/** Height above the base in feet: the one place where the unit is changed, with an exact factor. */
function heightFt(context: Context, level: string, symbol: string, steps: Steps): Value {
  const base = context.model.levels[0]?.id ?? '';
  const values = [elevationOf(context, 'z', level), elevationOf(context, 'z_base', base)];
  const formula = feetPer(context.building.units) === 1 ? 'z − z_base' : `(z − z_base)/${METRES_PER_FOOT}`;
  return steps.add(symbol, formula, values, 'ft', { what: `height of level ${level} above the base` });
}

/** C_s with its limits, and the exponent k. */
function coefficientSteps(
  context: Context,
  path: string,
  height: Value,
  steps: Steps,
): { coefficient: Value; k: Value } {
  const basis = atPath(context.building, path) as AsceSeismic;
  const { governs, k, period: T } = baseShear(basis, height.value);
  const from = (symbol: string, key: string, byDefault: number, unit = '1'): Value =>
    fromFileOr(context, symbol, `${path}.${key}`, byDefault, unit);
  const [sds, sd1, r, importance] = [
    fromFile(context, 'S_DS', `${path}.SDS`, '1'),
    fromFile(context, 'S_D1', `${path}.SD1`, '1'),
    fromFile(context, 'R', `${path}.R`, '1'),
    from('I_e', 'importance', 1),
  ];
  const approximate = steps.add(
    'T_a',
    `C_t·${height.symbol}^x`,
    [from('C_t', 'Ct', 0.02), height, from('x', 'x', 0.75)],
    's',
    {
      what: 'approximate period',
      clause: 'ASCE 7-16 Eq. 12.8-7',
    },
  );
  const period = periodStep(context, path, basis, approximate, sd1, steps);
  const short = steps.add('C_1', 'S_DS/(R/I_e)', [sds, r, importance], '1', { clause: 'ASCE 7-16 Eq. 12.8-2' });
  const long = basis.TL ?? 8;
  const transition = from('T_L', 'TL', 8, 's');
  const most =
    T <= long
      ? steps.add('C_2', 'S_D1/(T·R/I_e)', [sd1, period, r, importance], '1', {
          what: 'T is at most T_L',
          clause: 'ASCE 7-16 Eq. 12.8-3',
        })
      : steps.add('C_2', 'S_D1·T_L/(T^2·R/I_e)', [sd1, transition, period, r, importance], '1', {
          what: 'T is beyond T_L',
          clause: 'ASCE 7-16 Eq. 12.8-4',
        });
  const least = steps.add('C_3', 'max(0.044·S_DS·I_e, 0.01)', [sds, importance], '1', {
    clause: 'ASCE 7-16 Eq. 12.8-5',
  });
  const near =
    (basis.S1 ?? 0) >= 0.6
      ? [
          steps.add('C_4', '0.5·S_1/(R/I_e)', [fromFile(context, 'S_1', `${path}.S1`, '1'), r, importance], '1', {
            what: 'S_1 is 0.6 or more',
            clause: 'ASCE 7-16 Eq. 12.8-6',
          }),
        ]
      : [];
  const coefficient = steps.add(
    'C_s',
    `max(min(C_1, C_2), ${[least, ...near].map(({ symbol }) => symbol).join(', ')})`,
    [short, most, least, ...near],
    '1',
    {
      what: `seismic response coefficient; Eq. ${governs} governs`,
      clause: 'ASCE 7-16 12.8.1.1',
    },
  );
  const middle = k !== 1 && k !== 2;
  const exponent = steps.add('k', middle ? '0.5·T + 0.75' : String(k), middle ? [period] : [], '1', {
    what: middle ? 'between 0.5 s and 2.5 s' : k === 1 ? 'T is at most 0.5 s' : 'T is at least 2.5 s',
    clause: 'ASCE 7-16 12.8.3',
  });
  return { coefficient, k: exponent };
}

function periodStep(
  context: Context,
  path: string,
  basis: AsceSeismic,
  approximate: Value,
  sd1: Value,
  steps: Steps,
): Value {
  if (basis.period === undefined) {
    return steps.add('T', 'T_a', [approximate], 's', { what: 'the file states no period', clause: 'ASCE 7-16 12.8.2' });
  }
  const limit = upperLimit(basis.SD1);
  const rows = [
    [0.1, 1.7],
    [0.15, 1.6],
    [0.2, 1.5],
    [0.3, 1.4],
  ] as const;
  const i = rows.findIndex(([x]) => basis.SD1 <= x);
  const [low, high] = [rows[i - 1], rows[i]];
  const between = low !== undefined && high !== undefined && limit !== high[1];
  const upper = steps.add(
    'C_u',
    between ? `${low[1]} − (${low[1]} − ${high[1]})·(S_D1 − ${low[0]})/(${high[0]} − ${low[0]})` : String(limit),
    between ? [sd1] : [],
    '1',
    { clause: 'ASCE 7-16 Table 12.8-1' },
  );
  const own = fromFile(context, 'T_stated', `${path}.period`, 's');
  return steps.add('T', 'min(T_stated, C_u·T_a)', [own, upper, approximate], 's', { clause: 'ASCE 7-16 12.8.2' });
}

/** F_px with its floor and cap. */
export function asceDiaphragmForce(context: Context, demand: Demand, path: string, level: number, steps: Steps): void {
  const above = context.model.levels.filter(({ index }) => index >= level);
  const weights = above.map(({ index }) => weightStep(context, index, steps, `w_${index}`));
  const forces = above.flatMap(({ id, index }) => fromDemand(context, `F_${index}`, demand, id, 'force') ?? []);
  const own = weights[0] as Value;
  const inertia = weights.every(({ value }) => value === 0)
    ? steps.add('F_1', '0', [], demand.unit, { what: 'nothing is weighed here or above' })
    : steps.add(
        'F_inertia',
        `(${sumOf(forces)})/(${sumOf(weights)})·${own.symbol}`,
        [...forces, ...weights],
        demand.unit,
        {
          clause: 'ASCE 7-16 Eq. 12.10-1',
        },
      );
  const values = [
    fromFile(context, 'S_DS', `${path}.SDS`, '1'),
    fromFileOr(context, 'I_e', `${path}.importance`, 1, '1'),
    own,
  ];
  const floor = steps.add('F_min', `0.2·S_DS·I_e·${own.symbol}`, values, demand.unit, {
    clause: 'ASCE 7-16 Eq. 12.10-2',
  });
  const cap = steps.add('F_max', `0.4·S_DS·I_e·${own.symbol}`, values, demand.unit, {
    clause: 'ASCE 7-16 Eq. 12.10-3',
  });
  steps.add('F_px', `min(max(${inertia.symbol}, F_min), F_max)`, [inertia, floor, cap], demand.unit, {
    clause: 'ASCE 7-16 12.10.1.1',
  });
}
