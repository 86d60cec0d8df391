/** Workings of a level's force and diaphragm design force, by what the load case takes them from. */
import { isAsce } from '../loads/basis-of.js';
import type { Demand } from '../path/result.js';
import { asceDiaphragmForce, asceForce } from './asce-forces.js';
import { basisPlace } from './basis-path.js';
import { casePath, fromDemand, fromFile, fromFileOr, levelOf, readOff, runOf, type Context } from './context.js';
import { enForce } from './en-forces.js';
import type { Steps, Value } from './steps.js';
import { windLoads } from './wind-load.js';

export function levelForce(context: Context, demand: Demand, steps: Steps): void {
  const { loadCase } = runOf(context, demand.case).subCase;
  if (loadCase.from === 'stated') {
    stated(context, demand, steps, 'force');
    return;
  }
  const place = basisPlace(context.building, loadCase);
  const level = levelOf(context, demand.member).index;
  if (loadCase.kind === 'wind') windForce(context, demand, level, steps);
  else if (isAsce(place?.basis)) asceForce(context, `${place.path}.seismic`, level, steps);
  else if (place !== undefined) enForce(context, `${place.path}.seismic`, level, steps);
  else throw new Error(`no basis for ${loadCase.id}`);
}

export function levelDiaphragmForce(context: Context, demand: Demand, steps: Steps): void {
  const { loadCase } = runOf(context, demand.case).subCase;
  if (loadCase.from === 'stated') {
    stated(context, demand, steps, 'diaphragmForce');
    return;
  }
  const place = basisPlace(context.building, loadCase);
  const level = levelOf(context, demand.member).index;
  if (loadCase.kind === 'wind') {
    const own = fromDemand(context, 'F', demand, demand.member, 'force');
    steps.add('F_p', own === undefined ? '0' : 'F', own === undefined ? [] : [own], demand.unit, {
      what: 'wind acts on the diaphragm as on the walls',
    });
    return;
  }
  if (isAsce(place?.basis)) {
    asceDiaphragmForce(context, demand, `${place.path}.seismic`, level, steps);
    return;
  }
  const force = fromDemand(context, 'F', demand, demand.member, 'force');
  if (force === undefined || place === undefined) throw new Error(`no force of ${demand.member}`);
  const overstrength = fromFileOr(context, 'γ_d', `${place.path}.seismic.diaphragmOverstrength`, 1.3, '1');
  steps.add('F_d', 'γ_d·F', [overstrength, force], demand.unit, { clause: 'EN 1998-1 4.4.2.5(2)' });
}

/** The wind of the stretches of façade that go to the level; three quarters of it with an eccentricity. */
function windForce(context: Context, demand: Demand, level: number, steps: Steps): void {
  const { subCase } = runOf(context, demand.case);
  const { length } = context.units;
  const loads = windLoads(context, subCase.loadCase, demand.member, steps);
  const widths: Value[] = [];
  (subCase.facade?.[level] ?? []).forEach(({ from, to }, i) => {
    widths.push(readOff(context, `b_${i + 1}`, 'levels', to - from, length, 'width of the stretch, from the outlines'));
  });
  const sum = loads.map(({ symbol }, i) => `${symbol}·${widths[i]?.symbol ?? ''}`).join(' + ');
  const part = subCase.eccentricity === 0 ? '' : '0.75·';
  steps.add('F', loads.length === 0 ? '0' : `${part}(${sum})`, [...loads, ...widths], demand.unit, {
    what: subCase.eccentricity === 0 ? 'the whole wind' : 'three quarters of the wind, with an eccentricity',
    clause: 'ASCE 7-16 27.3.1, Fig. 27.3-8',
  });
}

/** A force that the file states; the diaphragm's is the level's where the file leaves it out. */
function stated(context: Context, demand: Demand, steps: Steps, key: 'force' | 'diaphragmForce'): void {
  const { loadCase } = runOf(context, demand.case).subCase;
  const forces = loadCase.from === 'stated' ? loadCase.forces : [];
  const index = forces.findIndex(({ level }) => level === demand.member);
  const symbol = key === 'force' ? 'F' : 'F_p';
  if (index < 0) {
    steps.add(symbol, '0', [], demand.unit, { what: 'the load case states no force for this level' });
    return;
  }
  const path = `${casePath(context, demand.case)}.forces[${index}]`;
  const own = key === 'force' || forces[index]?.diaphragmForce !== undefined ? key : 'force';
  const value = fromFile(context, 'F_stated', `${path}.${own}`, demand.unit);
  steps.add(symbol, 'abs(F_stated)', [value], demand.unit, { what: 'stated in the file' });
}
