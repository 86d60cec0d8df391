/** Workings of wind on a façade, ASCE 7 directional procedure: from the basic wind speed to load per unit span. */
import type { AsceWind } from '../building/basis.js';
import type { PlainCase } from '../building/definition.js';
import { unitVector } from '../geometry/frame.js';
import { profileOf, type WindEdition } from '../loads/asce7/velocity-pressure.js';
import { windOn, type WindLevel, type WindStrip } from '../loads/asce7/wind-forces.js';
import { isAsce } from '../loads/basis-of.js';
import { basisPlace } from './basis-path.js';
import { elevationOf, fromFile, fromFileOr, readOff, type Context } from './context.js';
import type { Steps, Value } from './steps.js';

/** What all stretches of façade have in common. */
type Wind = {
  readonly context: Context;
  readonly steps: Steps;
  readonly edition: WindEdition;
  readonly basis: AsceWind;
  /** `basis.wind` or `bases[i].wind` */
  readonly path: string;
  /** K_zt, K_e, V in mi/h, with K_d in 7-16 */
  readonly speed: readonly Value[];
};

/**
 * Steps down to the load per unit span of every stretch of façade that goes to a level.
 *
 * @returns the loads in the order of the façade's stretches [force/length]
 */
export function windLoads(context: Context, loadCase: PlainCase, level: string, steps: Steps): Value[] {
  const place = basisPlace(context.building, loadCase);
  if (!isAsce(place?.basis) || place.basis.wind === undefined) throw new Error(`no wind for ${loadCase.id}`);
  const { wind: basis, standard: edition } = place.basis;
  const { levels, heightFt } = windOn(context.building, edition, basis, unitVector(loadCase.direction));
  const found = levels.find(({ facade }) => facade.level === level);
  if (found === undefined) return [];
  const path = `${place.path}.wind`;
  const wind: Wind = { context, steps, edition, basis, path, speed: speedSteps(context, edition, path, steps) };
  const top = levels[levels.length - 1]?.facade.level ?? level;
  const roof =
    basis.roofHeight === undefined
      ? heightStep(wind, top, 'h')
      : feet(wind, 'h', 'h_r', [fromFile(context, 'h_r', `${path}.roofHeight`, context.units.length)]);
  const qh = pressureStep(wind, 'h', exposureStep(wind, 'h', roof, heightFt));
  const leeward = leewardStep(wind, found, qh);
  return found.strips.map((strip) => stripStep(wind, found, strip, leeward));
}

function speedSteps(context: Context, edition: WindEdition, path: string, steps: Steps): Value[] {
  const metric = context.units.length === 'm';
  const stated = fromFile(context, 'V_b', `${path}.V`, metric ? 'm/s' : 'mi/h', 'basic wind speed');
  const speed = metric ? steps.add('V', 'V_b/0.44704', [stated], 'mi/h') : steps.add('V', 'V_b', [stated], 'mi/h');
  const factor = (symbol: string, key: string, byDefault: number): Value =>
    fromFileOr(context, symbol, `${path}.${key}`, byDefault, '1');
  const factors = [factor('K_zt', 'Kzt', 1), factor('K_e', 'Ke', 1)];
  return [...factors, ...(edition === 'ASCE 7-16' ? [directionality({ context, path })] : []), speed];
}

function directionality({ context, path }: Pick<Wind, 'context' | 'path'>): Value {
  return fromFileOr(context, 'K_d', `${path}.Kd`, 0.85, '1');
}

/** Of a level over the ground [ft] */
function heightStep(wind: Wind, level: string, symbol: string): Value {
  const { context, path, basis } = wind;
  const lowest = context.model.levels[0]?.id ?? '';
  const ground =
    basis.ground === undefined
      ? elevationOf(context, 'z_g', lowest)
      : fromFile(context, 'z_g', `${path}.ground`, context.units.length);
  return feet(wind, symbol, 'z_l − z_g', [elevationOf(context, 'z_l', level), ground]);
}

function feet({ context, steps }: Wind, symbol: string, formula: string, values: readonly Value[]): Value {
  const metric = context.units.length === 'm';
  const text = !metric ? formula : values.length === 1 ? `${formula}/0.3048` : `(${formula})/0.3048`;
  return steps.add(steps.fresh(symbol), text, values, 'ft', { what: 'height above the ground' });
}

function exposureStep({ steps, edition, basis }: Wind, name: string, height: Value, heightFt: number): Value {
  const { factor, alpha, zgFt } = profileOf(edition, basis.exposure);
  const z = heightFt < 15 ? '15' : height.symbol;
  return steps.add(
    steps.fresh(`K_${name}`),
    `${factor}·(${z}/${zgFt})^(2/${alpha})`,
    heightFt < 15 ? [] : [height],
    '1',
    {
      what: `exposure ${basis.exposure}${heightFt < 15 ? ', as at 15 ft' : ''}`,
      clause: `${edition} Table 26.10-1`,
    },
  );
}

/** The mean of K_z over a height, by the integral of the power law, which does not change under 15 ft. */
function meanStep(wind: Wind, { part }: WindStrip, perFoot: number): Value {
  const { context, steps, edition, basis } = wind;
  const { factor, alpha, zgFt } = profileOf(edition, basis.exposure);
  const integral = (end: 'low' | 'high'): Value => {
    const height = readOff(context, 'z_e', 'levels', part[end] / perFoot, 'ft', `${end} end of the façade`);
    const least = `${factor}·(15/${zgFt})^(2/${alpha})`;
    const above = `${factor}·${zgFt}/(2/${alpha} + 1)·((z_e/${zgFt})^(2/${alpha} + 1) − (15/${zgFt})^(2/${alpha} + 1))`;
    const formula = height.value <= 15 ? `${least}·z_e` : `${least}·15 + ${above}`;
    return steps.add(steps.fresh(`I_${end}`), formula, [height], 'ft', { what: 'K_z integrated from the ground up' });
  };
  const [low, high] = [integral('low'), integral('high')];
  const height = heightOf(context, part.high - part.low, 't');
  const inFeet = feet(wind, 't_z', 't', [height]);
  return steps.add(steps.fresh('K_z'), `(${high.symbol} − ${low.symbol})/${inFeet.symbol}`, [high, low, inFeet], '1', {
    what: 'mean over the height that goes to the level',
    clause: `${edition} Table 26.10-1`,
  });
}

function heightOf(context: Context, height: number, symbol: string): Value {
  return readOff(context, symbol, 'levels', height, context.units.length, 'height of façade that goes to the level');
}

function pressureStep({ steps, edition, speed }: Wind, name: string, exposure: Value): Value {
  const factors = speed.map(({ symbol }) => (symbol === 'V' ? 'V^2' : symbol)).join('·');
  return steps.add(steps.fresh(`q_${name}`), `0.00256·${exposure.symbol}·${factors}`, [exposure, ...speed], 'lb/ft²', {
    what: 'velocity pressure',
    clause: `${edition} Eq. 26.10-1`,
  });
}

/** G, with K_d where it stands in the pressure. */
function gust({ context, edition, path }: Wind): Value[] {
  const factor = fromFileOr(context, 'G', `${path}.G`, 0.85, '1');
  return edition === 'ASCE 7-22' ? [directionality({ context, path }), factor] : [factor];
}

function product(values: readonly Value[]): string {
  return values.map(({ symbol }) => symbol).join('·');
}

function leewardStep(wind: Wind, { facade }: WindLevel, qh: Value): Value {
  const { context, steps, edition } = wind;
  const side = (symbol: string, value: number, what: string): Value =>
    readOff(context, symbol, 'levels', value, context.units.length, what);
  const along = side('L', facade.along, 'dimension of the level’s outlines along the wind');
  const across = side('B', facade.across, 'dimension across the wind');
  const ratio = facade.along / facade.across;
  const formula = ratio <= 1 ? '0.5' : ratio <= 2 ? '0.5 − 0.2·(L/B − 1)' : ratio < 4 ? '0.3 − 0.05·(L/B − 2)' : '0.2';
  const coefficient = steps.add('C_pl', formula, formula.includes('L') ? [along, across] : [], '1', {
    what: 'leeward wall, as suction',
    clause: `${edition} Fig. 27.3-1`,
  });
  const factors = [qh, ...gust(wind), coefficient];
  return steps.add('p_l', product(factors), factors, 'lb/ft²', {
    what: 'leeward',
    clause: `${edition} Eq. 27.3-1`,
  });
}

function stripStep(wind: Wind, { facade }: WindLevel, strip: WindStrip, leeward: Value): Value {
  const { context, steps, edition, basis, path } = wind;
  const { units } = context;
  const perFoot = units.length === 'm' ? 0.3048 : 1;
  const exposure =
    basis.heightRule === 'mean'
      ? meanStep(wind, strip, perFoot)
      : exposureStep(wind, 'z', heightStep(wind, facade.level, 'z'), facade.height / perFoot);
  const factors = [pressureStep(wind, 'z', exposure), ...gust(wind)];
  const windward = steps.add(steps.fresh('p_w'), `${product(factors)}·0.8`, factors, 'lb/ft²', {
    what: 'windward',
    clause: `${edition} Eq. 27.3-1, Fig. 27.3-1`,
  });
  const net = steps.add(steps.fresh('p'), `max(${windward.symbol} + p_l, 16)`, [windward, leeward], 'lb/ft²', {
    what: 'both walls; internal pressure cancels',
    clause: `${edition} 27.1.5`,
  });
  const values = [net, heightOf(context, strip.part.high - strip.part.low, 't')];
  let formula = `${net.symbol}·t`;
  if (strip.parapetPsf > 0) {
    const parapet = fromFile(context, 'h_p', `${path}.parapet`, units.length);
    const roof = heightStep(wind, facade.level, 'z');
    const top = feet(wind, 'z_p', `${roof.symbol}${perFoot === 1 ? '' : '·0.3048'} + h_p`, [roof, parapet]);
    const q = pressureStep(wind, 'p', exposureStep(wind, 'p', top, top.value));
    const of = [q, ...(edition === 'ASCE 7-22' ? [directionality(wind)] : [])];
    const pressure = steps.add(steps.fresh('p_p'), `2.5·${product(of)}`, of, 'lb/ft²', {
      what: 'windward and leeward parapet',
      clause: `${edition} 27.3.4`,
    });
    formula = `(${formula} + ${pressure.symbol}·h_p)`;
    values.push(pressure, parapet);
  }
  const inUnits = units.length === 'm' ? '·0.45359237·9.80665/(0.3048^2·1000)' : '/1000';
  return steps.add(steps.fresh('w'), `${formula}${inUnits}`, values, units.perLength, {
    what: 'load per unit span',
  });
}
