/** The whole on which a level's force lies: the weight, area or width of all its diaphragms. */
import type { Inertia } from '../diaphragms/inertia.js';
import type { Profile } from '../geometry/profile.js';
import type { Demand } from '../path/result.js';
import { fromFile, readOff, runOf, type Context } from './context.js';
import { weightFactors, weightsOf, type AreaWeight, type Weighed } from './area-weight.js';
import type { Steps, Value } from './steps.js';

/** @param inertias how the level's force lies on each of the diaphragms that count */
export function totalStep(
  context: Context,
  inertias: readonly (Pick<Inertia, 'frame' | 'spread' | 'facade'> & Weighed)[],
  steps: Steps,
  symbol = 'Σn',
  named?: string,
): Value {
  const { length, force } = context.units;
  const terms: string[] = [];
  const values: Value[] = [];
  const spread = inertias[0]?.spread ?? 'even';
  for (const inertia of inertias) {
    const { diaphragm, frame, facade = [] } = inertia;
    const profile = diaphragm.profiles[frame] as Profile;
    const outline = `${diaphragm.path}.outline`;
    if (spread === 'even') {
      const width = readOff(
        context,
        `B_${values.length + 1}`,
        outline,
        profile.to - profile.from,
        length,
        'width across the load',
      );
      terms.push(width.symbol);
      values.push(width);
      continue;
    }
    if (spread === 'facade') {
      for (const { from, to, w } of facade) {
        const mean = (w[0] ?? 0) + ((w[1] ?? 0) * (to - from)) / 2;
        const i = values.length + 1;
        const load = readOff(
          context,
          `w_${i}`,
          outline,
          mean,
          context.units.perLength,
          'mean load of the façade per length',
        );
        const width = readOff(context, `B_${i}`, outline, to - from, length, 'width across the load');
        terms.push(`${load.symbol}·${width.symbol}`);
        values.push(load, width);
      }
      continue;
    }
    for (const { weight: stated, area } of areas(profile, inertia)) {
      const i = values.length + 1;
      const a = readOff(context, `A_${i}`, outline, area, `${length}²`, 'floor area, less openings');
      if (stated === undefined) {
        terms.push(a.symbol);
        values.push(a);
        continue;
      }
      const weight = weightFactors(context, inertia, stated, `q_${i}`);
      terms.push(`${weight.map(({ symbol }) => symbol).join('·')}·${a.symbol}`);
      values.push(...weight, a);
    }
    if (spread === 'area') continue;
    (diaphragm.diaphragm.weight?.lines ?? []).forEach((line, l) => {
      if (line.perLength === 0) return;
      const path = `${diaphragm.path}.weight.lines[${l}]`;
      const i = values.length + 1;
      let own = 0;
      line.along.forEach((b, j) => {
        const a = line.along[j - 1];
        if (a !== undefined) own += Math.hypot(b[0] - a[0], b[1] - a[1]);
      });
      const p = fromFile(context, `p_${i}`, `${path}.perLength`, context.units.perLength);
      const l_ = readOff(context, `l_${i}`, `${path}.along`, own, length, `length of ${line.id}`);
      terms.push(`${p.symbol}·${l_.symbol}`);
      values.push(p, l_);
    });
  }
  const unit = { weight: force, facade: force, area: `${length}²`, even: length }[spread];
  const what = {
    weight: 'seismic weight',
    area: 'floor area',
    even: 'width across the load',
    facade: 'load of the façade',
  }[spread];
  return steps.add(steps.fresh(symbol), terms.length === 0 ? '0' : terms.join(' + '), values, unit, {
    what: named ?? `${what} of the level`,
  });
}

/** How a level's force lies on all of its diaphragms. */
export function levelInertias(context: Context, of: Pick<Demand, 'case'>, level: number): Inertia[] {
  return (runOf(context, of.case).outcomes[level]?.diaphragms ?? []).map(({ pushed }) => pushed.inertia);
}

/** Net area by area weight; all in one for `area`. */
function areas(
  profile: Profile,
  { spread, liveShare = 0 }: Pick<Inertia, 'spread'> & Weighed,
): { weight: AreaWeight | undefined; area: number }[] {
  const sums = new Map<string, { weight: AreaWeight | undefined; area: number }>();
  for (const slab of profile.slabs) {
    for (const strip of slab.strips) {
      const area = ((strip.upper0 - strip.lower0 + strip.upper1 - strip.lower1) / 2) * (slab.to - slab.from);
      for (const weight of spread === 'weight' ? weightsOf(strip, liveShare) : [undefined]) {
        const key = weight === undefined ? '' : `${weight.of} ${weight.q}`;
        sums.set(key, { weight, area: (sums.get(key)?.area ?? 0) + area });
      }
    }
  }
  return [...sums.values()];
}
