/** The floor as parts on which a level's force lies: weight, area or width of every stretch between two breaks, and its centre. */
import type { Point } from '../building/definition.js';
import type { DiaphragmModel } from '../diaphragms/diaphragm.js';
import type { Inertia } from '../diaphragms/inertia.js';
import { dot } from '../geometry/frame.js';
import type { Profile, Slab } from '../geometry/profile.js';
import { weightFactors, weightsOf, type AreaWeight } from './area-weight.js';
import { fromFile, fromFileOr, readOff, type Context } from './context.js';
import type { Steps, Value } from './steps.js';

/** A part: what it weighs, or its area or width [as the level's force lies], and where its centre is along s. */
export type FloorPart = { readonly size: Value; readonly at: Value };

/** Two places along s, and which loads at one place, such as a façade that runs with the load, count between them. */
export type Reach = {
  readonly from: number;
  readonly to: number;
  readonly holds: (s: number) => boolean;
};

/**
 * Steps for the parts of a floor between two places along s.
 *
 * @param inertia how the level's force lies on the diaphragm; any eccentricity is left out
 */
export function floorParts(context: Context, inertia: Inertia, reach: Reach, steps: Steps): FloorPart[] {
  const profile = inertia.diaphragm.profiles[inertia.frame] as Profile;
  const { path } = inertia.diaphragm;
  const outline = `${path}.outline`;
  const { length } = context.units;
  const place = (symbol: string, s: number): Value =>
    readOff(context, symbol, outline, s, length, 'place along the span');
  const parts: FloorPart[] = [];
  if (inertia.spread === 'even') {
    const from = place('s_a', Math.max(profile.from, reach.from));
    const to = place('s_b', Math.min(profile.to, reach.to));
    if (to.value - from.value <= profile.tolerance) return [];
    const size = steps.add(steps.fresh('n'), 's_b − s_a', [from, to], length, {
      what: 'width that the level’s force is spread over',
    });
    return [{ size, at: steps.add(steps.fresh('s'), '(s_a + s_b)/2', [from, to], length) }];
  }
  if (inertia.spread === 'facade') return facadeParts(context, inertia, reach, steps);
  for (const slab of profile.slabs) {
    const a = Math.max(slab.from, reach.from);
    const b = Math.min(slab.to, reach.to);
    if (b - a <= profile.tolerance) continue;
    const part = slabPart(context, inertia, slab, place('s_a', a), place('s_b', b), steps);
    if (part !== undefined) parts.push(part);
  }
  if (inertia.spread === 'weight') parts.push(...lineParts(context, inertia, profile, reach, steps));
  return parts;
}

/** Stretches of a façade with one load per length. */
function facadeParts(
  context: Context,
  { diaphragm, frame, facade = [] }: Inertia,
  reach: Reach,
  steps: Steps,
): FloorPart[] {
  const { tolerance } = diaphragm.profiles[frame] as Profile;
  const { length, force, perLength } = context.units;
  const read = (symbol: string, value: number, unit: string, what: string): Value =>
    readOff(context, symbol, `${diaphragm.path}.outline`, value, unit, what);
  return facade.flatMap((piece) => {
    const a = Math.max(piece.from, reach.from);
    const b = Math.min(piece.to, reach.to);
    if (b - a <= tolerance) return [];
    const from = read('s_a', a, length, 'place along the span');
    const to = read('s_b', b, length, 'place along the span');
    const load = (s: number): number => (piece.w[0] ?? 0) + (piece.w[1] ?? 0) * (s - piece.from);
    const near = read('w_a', load(a), perLength, 'load of the façade per length');
    const far = read('w_b', load(b), perLength, 'load of the façade per length');
    const even = near.value === far.value;
    const size = steps.add(
      steps.fresh('n'),
      even ? 'w_a·(s_b − s_a)' : '(w_a + w_b)/2·(s_b − s_a)',
      even ? [near, to, from] : [near, far, to, from],
      force,
    );
    const centre = even ? '(s_a + s_b)/2' : 's_a + (s_b − s_a)·(w_a + 2·w_b)/(3·(w_a + w_b))';
    const at = steps.add(steps.fresh('s'), centre, even ? [from, to] : [from, to, near, far], length, {
      what: 'its centre',
    });
    return [{ size, at }];
  });
}

type Depth = { readonly weight: AreaWeight | undefined; readonly depth: number };

/** A stretch in which every depth is linear: its size is its mean load per length times its length. */
function slabPart(
  context: Context,
  inertia: Inertia,
  slab: Slab,
  from: Value,
  to: Value,
  steps: Steps,
): FloorPart | undefined {
  const { diaphragm, spread } = inertia;
  const { length, force } = context.units;
  const weighs = spread === 'weight';
  const unit = weighs ? force : `${length}²`;
  const perLength = weighs ? `${force}/${length}` : length;
  const at = (s: number, end: string, depths: Map<string, Depth>): Value => {
    const values: Value[] = [];
    const terms: string[] = [];
    for (const { weight: stated, depth } of depths.values()) {
      const i = terms.length + 1;
      const d = readOff(context, `d_${i}`, `${diaphragm.path}.outline`, depth, length, `net depth at s = ${round(s)}`);
      if (stated === undefined) terms.push(d.symbol);
      else {
        const weight = weightFactors(context, inertia, stated, `q_${i}`);
        terms.push(`${weight.map(({ symbol }) => symbol).join('·')}·${d.symbol}`);
        values.push(...weight);
      }
      values.push(d);
    }
    return steps.add(steps.fresh(`w_${end}`), terms.join(' + '), values, perLength, { what: `at s = ${round(s)}` });
  };
  const depthsAt = (s: number): Map<string, Depth> => {
    const depths = new Map<string, Depth>();
    const part = (s - slab.from) / (slab.to - slab.from);
    for (const strip of slab.strips) {
      const depth = (strip.upper0 - strip.lower0) * (1 - part) + (strip.upper1 - strip.lower1) * part;
      for (const weight of weighs ? weightsOf(strip, inertia.liveShare) : [undefined]) {
        const key = weight === undefined ? '' : `${weight.of} ${weight.q}`;
        depths.set(key, { weight, depth: (depths.get(key)?.depth ?? 0) + depth });
      }
    }
    return depths;
  };
  const [near, far] = [depthsAt(from.value), depthsAt(to.value)];
  if (near.size === 0) return undefined;
  const even = [...near].every(
    ([key, { depth }]) => Math.abs(depth - (far.get(key)?.depth ?? 0)) <= 1e-12 * Math.abs(depth),
  );
  const a = at(from.value, 'a', near);
  if (even) {
    const size = steps.add(steps.fresh('n'), `${a.symbol}·(s_b − s_a)`, [a, to, from], unit);
    return { size, at: steps.add(steps.fresh('s'), '(s_a + s_b)/2', [from, to], length, { what: 'its centre' }) };
  }
  const b = at(to.value, 'b', far);
  const size = steps.add(steps.fresh('n'), `(${a.symbol} + ${b.symbol})/2·(s_b − s_a)`, [a, b, to, from], unit);
  const centre = `s_a + (s_b − s_a)·(${a.symbol} + 2·${b.symbol})/(3·(${a.symbol} + ${b.symbol}))`;
  return { size, at: steps.add(steps.fresh('s'), centre, [from, to, a, b], length, { what: 'its centre' }) };
}

/** The diaphragm's own area weight, or that of the zone which has this one. */
export function areaWeight(context: Context, { diaphragm, path }: DiaphragmModel, q: number, symbol: string): Value {
  const unit = `${context.units.force}/${context.units.length}²`;
  const zone = (diaphragm.weight?.zones ?? []).findIndex(({ area }) => area === q);
  return q === diaphragm.weight?.area || zone < 0
    ? fromFileOr(context, symbol, `${path}.weight.area`, 0, unit)
    : fromFile(context, symbol, `${path}.weight.zones[${zone}].area`, unit);
}

/** Façades and partitions: along the cut at one place, across it over their length. */
function lineParts(
  context: Context,
  { diaphragm }: Inertia,
  profile: Profile,
  reach: Reach,
  steps: Steps,
): FloorPart[] {
  const { length, force, perLength } = context.units;
  const { frame, tolerance } = profile;
  const within = (s: number): number => Math.min(Math.max(s, profile.from), profile.to);
  const parts: FloorPart[] = [];
  (diaphragm.diaphragm.weight?.lines ?? []).forEach((line, l) => {
    if (line.perLength === 0) return;
    const path = `${diaphragm.path}.weight.lines[${l}]`;
    for (let i = 0; i + 1 < line.along.length; i++) {
      const a = line.along[i] as Point;
      const b = line.along[i + 1] as Point;
      const whole = Math.hypot(b[0] - a[0], b[1] - a[1]);
      if (whole === 0) continue;
      const ends = [within(dot(a, frame.s)), within(dot(b, frame.s))];
      const from = Math.min(...ends);
      const to = Math.max(...ends);
      let own = whole;
      let centre = from;
      if (to - from <= tolerance) {
        if (!reach.holds(from)) continue;
      } else {
        const low = Math.max(from, reach.from);
        const high = Math.min(to, reach.to);
        if (high - low <= tolerance) continue;
        own = (whole * (high - low)) / (to - from);
        centre = (low + high) / 2;
      }
      const size = steps.add(
        steps.fresh('n'),
        'p·l',
        [
          fromFile(context, 'p', `${path}.perLength`, perLength),
          readOff(context, 'l', `${path}.along`, own, length, 'its length here'),
        ],
        force,
        { what: `weight line ${line.id}` },
      );
      const at = readOff(context, `s_${size.symbol}`, `${path}.along`, centre, length, 'its centre along the span');
      parts.push({ size, at });
    }
  });
  return parts;
}

export function round(value: number): string {
  return String(Number(value.toPrecision(6)));
}
