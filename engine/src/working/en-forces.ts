/** Workings of the lateral force method of EN 1998-1; its equations from memory, not checked against the document. */
import type { EnSeismic } from '../building/basis.js';
import { baseShear } from '../loads/en1998/lateral-force.js';
import { liveShareOf } from '../loads/en1998/live-share.js';
import { spectrumOf } from '../loads/en1998/spectrum.js';
import { METRES_PER_FOOT, metresPer } from '../loads/units.js';
import { elevationOf, fromFile, fromFileOr, readOff, type Context } from './context.js';
import { atPath } from './file-path.js';
import { weightStep } from './mass.js';
import { sumOf, type Steps, type Value } from './steps.js';

/** Steps down to F_i of a level. */
export function enForce(context: Context, path: string, level: number, steps: Steps): void {
  const { force, length } = context.units;
  const levels = context.model.levels.slice(1);
  const base = context.model.levels[0]?.id ?? '';
  const heights = levels.map(({ id, index }) =>
    steps.add(
      `z_${index}`,
      'z − z_base',
      [elevationOf(context, 'z', id), elevationOf(context, 'z_base', base)],
      length,
      {
        what: `height of level ${id} above the base`,
      },
    ),
  );
  const ratio = ordinateSteps(context, path, heights[heights.length - 1] as Value, levels.length, steps);
  const liveShare = liveShareOf(atPath(context.building, path) as EnSeismic); // Eq. 3.17
  const weights = levels.map(({ index }) => weightStep(context, index, steps, `w_${index}`, liveShare));
  const whole = steps.add('W', sumOf(weights), weights, force, { what: 'weight m·g' });
  const shear = steps.add('F_b', 's_d·λ·W', [ratio.ordinate, ratio.lambda, whole], force, {
    what: 'base shear',
    clause: 'EN 1998-1 Eq. 4.5',
  });
  const own = levels.findIndex(({ index }) => index === level);
  const product = (i: number): string => `${heights[i]?.symbol ?? ''}·${weights[i]?.symbol ?? ''}`;
  const sum = levels.map((_, i) => product(i)).join(' + ');
  steps.add('F_i', `F_b·${product(own)}/(${sum})`, [shear, ...heights, ...weights], force, {
    clause: 'EN 1998-1 Eq. 4.11',
  });
}

/** The design spectrum at the building's period, over the acceleration of gravity, and λ. */
function ordinateSteps(
  context: Context,
  path: string,
  height: Value,
  storeys: number,
  steps: Steps,
): { ordinate: Value; lambda: Value } {
  const basis = atPath(context.building, path) as EnSeismic;
  const metres = metresPer(context.building.units);
  const found = baseShear(basis, height.value * metres, storeys);
  const { S, TB, TC, TD } = spectrumOf(basis);
  const clause = 'EN 1998-1 Tables 3.2, 3.3';
  const named = (symbol: string, value: number, unit: string): Value =>
    steps.add(symbol, String(value), [], unit, {
      what: `ground type ${basis.groundType}, spectrum of ${basis.spectrum ?? 'type 1'}`,
      clause,
    });
  const ground = steps.add(
    'a_g',
    'γ_I·a_gR',
    [fromFileOr(context, 'γ_I', `${path}.importance`, 1, '1'), fromFile(context, 'a_gR', `${path}.agR`, '1')],
    '1',
    {
      what: 'ground acceleration over gravity',
      clause: 'EN 1998-1 3.2.1(3)',
    },
  );
  const q = fromFile(context, 'q', `${path}.q`, '1');
  const period =
    basis.period === undefined
      ? steps.add(
          'T_1',
          metres === 1 ? `C_t·${height.symbol}^0.75` : `C_t·(${height.symbol}·${METRES_PER_FOOT})^0.75`,
          [fromFileOr(context, 'C_t', `${path}.Ct`, 0.05, '1'), height],
          's',
          { clause: 'EN 1998-1 Eq. 4.6' },
        )
      : steps.add('T_1', 'T', [fromFile(context, 'T', `${path}.period`, 's')], 's', { what: 'stated in the file' });
  const soil = named('S', S, '1');
  const { governs } = found.spectrum;
  const [tb, tc, td] = [named('T_B', TB, 's'), named('T_C', TC, 's'), named('T_D', TD, 's')];
  const curve =
    found.period < TB
      ? steps.add('s_1', 'a_g·S·(2/3 + T_1/T_B·(2.5/q − 2/3))', [ground, soil, period, tb, q], '1', {
          clause: 'EN 1998-1 Eq. 3.13',
        })
      : found.period <= TC
        ? steps.add('s_1', 'a_g·S·2.5/q', [ground, soil, q], '1', { clause: 'EN 1998-1 Eq. 3.14' })
        : found.period <= TD
          ? steps.add('s_1', 'a_g·S·2.5/q·T_C/T_1', [ground, soil, q, tc, period], '1', {
              clause: 'EN 1998-1 Eq. 3.15',
            })
          : steps.add('s_1', 'a_g·S·2.5/q·T_C·T_D/T_1^2', [ground, soil, q, tc, td, period], '1', {
              clause: 'EN 1998-1 Eq. 3.16',
            });
  const bounded = found.period > TC;
  const ordinate = steps.add(
    's_d',
    bounded ? 'max(s_1, β·a_g)' : 's_1',
    bounded ? [curve, fromFileOr(context, 'β', `${path}.beta`, 0.2, '1'), ground] : [curve],
    '1',
    {
      what: `design spectrum over gravity; ${governs === 'lower bound' ? 'its lower bound' : `Eq. ${governs}`} governs`,
      clause: 'EN 1998-1 3.2.2.5(4)',
    },
  );
  const lambda =
    basis.lambda === undefined
      ? steps.add('λ', String(found.lambda), [], '1', {
          what:
            found.lambda === 1
              ? 'T_1 beyond 2·T_C, or two storeys or fewer'
              : 'T_1 at most 2·T_C, more than two storeys',
          clause: 'EN 1998-1 4.3.3.2.2(1)',
        })
      : readOff(context, 'λ', `${path}.lambda`, basis.lambda, '1', 'stated in the file');
  return { ordinate, lambda };
}
