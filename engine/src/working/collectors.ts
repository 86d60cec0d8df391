/** Workings of collectors: the axial force along a wall line, as the sum of all that pushes the line before a place. */
import { clip, collectorsOf, type CollectorLine } from '../path/collectors.js';
import { cutOf } from '../diaphragms/inner-forces.js';
import { transferFlows } from '../diaphragms/steps/transfer.js';
import { totalLength, type Interval } from '../geometry/profile.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import { tOn, type LineModel } from '../walls/wall-line.js';
import { fromDemand, pierPath, readOff, type Context } from './context.js';
import { designOf, type Design } from './design.js';
import { floorParts } from './floor-parts.js';
import { shareOfSupport } from './flexible-reaction.js';
import { netForces, shearStep, staticsOf } from './left-of.js';
import { pierShare } from './piers.js';
import { raisedShear } from './raised.js';
import type { SpanSource } from './span-steps.js';
import type { Steps, Value } from './steps.js';

/** The place along the line up to which everything is summed; `after` counts what acts at the place itself. */
type Place = { readonly t: number; readonly after: boolean };

/** A force that pushes the line between two places: its part before the cut is a term of N. */
type Term = { readonly text: string; readonly values: readonly Value[] };

type Collector = {
  readonly context: Context;
  readonly demand: Demand;
  readonly steps: Steps;
  readonly design: Design;
  readonly lines: readonly LineModel[];
  readonly place: Place;
};

export function collectorAxial(context: Context, demand: Demand, steps: Steps): void {
  const [levelId = '', lineId = ''] = demand.member.split('/');
  const level = context.model.levels.findIndex(({ id }) => id === levelId);
  const design = designOf(context, demand.case, level);
  const collector = collectorsOf(context.model, design.outcome, design.inner).find(({ lines }) =>
    lines.some(({ line }) => line.id === lineId),
  );
  if (collector === undefined) throw new Error(`no collector ${demand.member}`);
  const place = placeOf(collector, demand);
  if (place === undefined) {
    steps.add(steps.fresh('N'), '0', [], demand.unit, {
      what: `nothing ${demand.quantity === 'axial-tension' ? 'pulls' : 'presses'} the collector anywhere`,
    });
    return;
  }
  const made: Collector = { context, demand, steps, design, lines: collector.lines, place };
  const terms: Term[] = [];
  const onLines = new Map<LineModel, Value[]>();
  for (const outcome of design.outcome.diaphragms) terms.push(...floorTerms(made, outcome, onLines));
  for (const line of collector.lines) terms.push(...pierTerms(made, line, onLines.get(line) ?? []));
  const text = terms.map((term) => term.text).join(' ');
  const sum = steps.add(
    steps.fresh('N'),
    text === '' ? '0' : text.replace(/^\+ /, '').replace(/^− /, '−'),
    terms.flatMap(({ values }) => values),
    demand.unit,
    {
      what: 'axial force at the place, tension positive',
      clause: 'equilibrium of the line before the place',
    },
  );
  steps.add(demand.quantity === 'axial-tension' ? 'N_t' : 'N_c', `abs(${sum.symbol})`, [sum], demand.unit, {
    what: `largest ${demand.quantity === 'axial-tension' ? 'tension' : 'compression'}`,
  });
}

/** Where the row's value stands in the collector's axial force, by the row's place and size. */
function placeOf({ axial }: CollectorLine, { value, quantity, sense }: Demand): Place | undefined {
  if (value === 0) return undefined;
  const wanted = (quantity === 'axial-tension' ? 1 : -1) * sense * value;
  const { points } = axial;
  let best = -1;
  points.forEach((point, i) => {
    if (best < 0 || Math.abs(point.axial - wanted) < Math.abs((points[best]?.axial ?? 0) - wanted)) best = i;
  });
  const point = points[best];
  const before = points[best - 1];
  if (point === undefined) return undefined;
  return { t: point.t, after: before !== undefined && before.t === point.t };
}

/** What a diaphragm puts into the line from both sides; what it gives to each line goes to `onLines`. */
function floorTerms(made: Collector, outcome: DiaphragmOutcome, onLines: Map<LineModel, Value[]>): Term[] {
  const { context, demand, steps, design, lines } = made;
  const { diaphragm } = outcome;
  const touched = lines.filter((line) => diaphragm.touches.some((touch) => touch.line === line));
  const [line] = touched;
  const touch = diaphragm.touches.find((each) => each.line === line);
  if (line === undefined || touch === undefined) return [];
  const level = made.design.outcome.level.id;
  const inner = design.inner.get(diaphragm)?.get(line.family);
  const give = (to: LineModel, value: Value): void => {
    onLines.set(to, [...(onLines.get(to) ?? []), value]);
  };
  if (inner === undefined) {
    if (outcome.rigid === undefined) return [];
    const net = netForces(context, demand, outcome, steps);
    const parts: Value[] = [];
    const texts: string[] = [];
    for (const each of touched) {
      const { given, taken } = net.get(each) ?? {};
      if (given !== undefined) {
        give(each, given);
        parts.push(given);
        texts.push(`${each.sign < 0 ? '−' : '+'} ${given.symbol}`);
      }
      if (taken !== undefined) {
        parts.push(taken);
        texts.push(`${each.sign < 0 ? '+' : '−'} ${taken.symbol}`);
      }
    }
    if (parts.length === 0) return [];
    const flow = steps.add(
      steps.fresh('H'),
      texts.join(' ').replace(/^\+ /, '').replace(/^− /, '−'),
      parts,
      context.units.force,
      { what: `what diaphragm ${diaphragm.key} gives to the line, along the line’s t` },
    );
    return spread(made, clip(cutOf(diaphragm, line), lines, level), flow, `${diaphragm.path}.outline`);
  }
  const statics = staticsOf(context, demand, outcome, line.family, steps);
  const before = shearStep(statics, line.s, false, steps.fresh('V_near'));
  const after = shearStep(statics, line.s, true, steps.fresh('V_far'));
  const near = steps.add(steps.fresh('H'), `−${before.symbol}`, [before], context.units.force, {
    what: 'from the floor on the near side',
  });
  let count = 0;
  const terms = [
    ...spread(made, clip(touch.cut.left, lines, level), near, `${diaphragm.path}.outline`),
    ...spread(made, clip(touch.cut.right, lines, level), after, `${diaphragm.path}.outline`),
  ];
  const along = alongParts(made, outcome, line, statics.source);
  for (const { force, from, to } of along)
    terms.push(...stretch(made, force, from, to, `${diaphragm.path}.weight.lines`));
  // What transfer diaphragms at steps of the outline put into the line and take out again.
  for (const [side, cut] of [
    [-1, touch.cut.left],
    [1, touch.cut.right],
  ] as const) {
    transferFlows(inner, line.s, side, cut).forEach(({ from, to, force }) => {
      const symbol = `X_${(count += 1)}`;
      const what = 'from a transfer diaphragm at a step of the outline';
      const value = readOff(
        context,
        symbol,
        `${diaphragm.path}.outline`,
        force * demand.sense,
        context.units.force,
        what,
      );
      terms.push(...stretch(made, value, from, to, `${diaphragm.path}.outline`));
    });
  }
  // The whole that the floor hands over goes to the lines of the plane by their piers.
  if (outcome.rigid !== undefined) {
    const net = netFromSteps(made, outcome);
    for (const each of touched) {
      const given = net.get(each);
      if (given !== undefined) give(each, given);
    }
    return terms;
  }
  const held = touched.filter((each) => each.storeys[diaphragm.level] !== undefined);
  const taken = statics.source.outcome.taken;
  const whole = [near, after, ...along.map(({ force }) => force)];
  const formula = whole.map(({ symbol }) => symbol).join(' + ');
  for (const each of held) {
    const share = held.length > 1 ? shareOfSupport(context, held, each, outcome, steps) : undefined;
    const text = `${each.sign < 0 ? '−' : ''}${share === undefined ? '' : `${share.symbol}·`}(${formula}${stoppedText(made, touched, taken).text})`;
    give(
      each,
      steps.add(
        steps.fresh('R'),
        text,
        [...whole, ...stoppedText(made, touched, taken).values, ...(share === undefined ? [] : [share])],
        context.units.force,
        { what: `what diaphragm ${diaphragm.key} gives to line ${each.line.id}, along its axis` },
      ),
    );
  }
  return terms;
}

/** Walls of the same plane that stop here push the diaphragm at the line itself. */
function stoppedText(
  { context, demand, design, steps }: Collector,
  lines: readonly LineModel[],
  taken: DiaphragmOutcome['taken'],
): { text: string; values: Value[] } {
  const values: Value[] = [];
  const terms: string[] = [];
  const above = context.model.levels[design.outcome.level.index + 1];
  for (const line of lines) {
    if (!taken.has(line) || above === undefined) continue;
    const shear = fromDemand(context, `V_above_${line.index + 1}`, demand, `${line.line.id}/${above.id}`, 'shear');
    if (shear === undefined) continue;
    const own = raisedShear(context, demand, design.outcome.level.index, line, shear, steps);
    values.push(own);
    terms.push(`${line.sign < 0 ? '−' : '+'} ${own.symbol}`);
  }
  return { text: terms.length === 0 ? '' : ` ${terms.join(' ')}`, values };
}

/** The forces of a body that its statics have worked out already. */
function netFromSteps({ steps, context, demand }: Collector, outcome: DiaphragmOutcome): Map<LineModel, Value> {
  const net = new Map<LineModel, Value>();
  for (const [line, force] of outcome.given) {
    const step = steps.list.find(({ symbol }) => symbol === `V_${line.index + 1}`);
    net.set(
      line,
      step === undefined
        ? readOff(
            context,
            `V_${line.index + 1}`,
            outcome.diaphragm.path,
            (force[0] ?? 0) * demand.sense,
            context.units.force,
            `force into line ${line.line.id}: from the solution of K·u = F of the membrane`,
          )
        : { symbol: step.symbol, value: step.result, unit: step.unit, from: step.symbol },
    );
  }
  return net;
}

/** A force that goes evenly into the floor's cut. */
function spread(made: Collector, intervals: readonly Interval[], force: Value, path: string): Term[] {
  if (force.value === 0) return [];
  const before = intervals.map(([a, b]): Interval => [Math.min(a, made.place.t), Math.min(b, made.place.t)]);
  return part(made, force, totalLength(before), totalLength(intervals), path);
}

/** A force evenly between two places, or at one. */
function stretch(made: Collector, force: Value, a: number, b: number, path: string): Term[] {
  const from = Math.min(a, b);
  const to = Math.max(a, b);
  const { t, after } = made.place;
  const tolerance = 1e-9 * made.context.model.extent;
  if (to - from <= tolerance)
    return from < t - tolerance || (after && from <= t + tolerance)
      ? [{ text: `− ${force.symbol}`, values: [force] }]
      : [];
  return part(made, force, Math.min(to, t) - Math.min(from, t), to - from, path);
}

function part({ context }: Collector, force: Value, covered: number, whole: number, path: string): Term[] {
  if (covered <= 0 || whole <= 0) return [];
  if (Math.abs(covered - whole) <= 1e-12 * whole) return [{ text: `− ${force.symbol}`, values: [force] }];
  const { length } = context.units;
  const l = readOff(context, `l_${force.symbol}`, path, covered, length, 'length before the place');
  const L = readOff(context, `L_${force.symbol}`, path, whole, length, 'whole length');
  return [{ text: `− ${force.symbol}·${l.symbol}/${L.symbol}`, values: [force, l, L] }];
}

/** Façades and partitions that run along the line: their part of the level's force. */
function alongParts(
  { context, steps }: Collector,
  outcome: DiaphragmOutcome,
  line: LineModel,
  { push }: SpanSource,
): { force: Value; from: number; to: number }[] {
  const { inertia } = outcome.pushed;
  const tolerance = 1e-9 * context.model.extent;
  const stretches = inertia.along.filter(({ s }) => Math.abs(s - line.s) <= tolerance);
  if (push === undefined || inertia.frame !== line.family || stretches.length === 0) return [];
  const holds = (s: number): boolean => Math.abs(s - line.s) <= tolerance;
  return floorParts(context, inertia, { from: line.s, to: line.s, holds }, steps).map(({ size }, i) => {
    const force = steps.add(
      steps.fresh('f'),
      `${push.force.symbol}·${size.symbol}/${push.whole.symbol}`,
      [push.force, size, push.whole],
      context.units.force,
      { what: 'its part of the level’s force, along the line itself' },
    );
    return { force, from: stretches[i]?.t0 ?? 0, to: stretches[i]?.t1 ?? 0 };
  });
}

/** Piers above push the line, piers below hold it. */
function pierTerms(made: Collector, line: LineModel, given: readonly Value[]): Term[] {
  const { context, demand, steps, design } = made;
  const { index } = design.outcome.level;
  const upper = context.model.levels[index + 1];
  const terms: Term[] = [];
  const plain =
    upper === undefined || line.storeys[index + 1] === undefined
      ? undefined
      : fromDemand(context, `V_above_${line.index + 1}`, demand, `${line.line.id}/${upper.id}`, 'shear');
  const above = plain === undefined ? undefined : raisedShear(context, demand, index, line, plain, steps);
  if (above !== undefined) terms.push(...along(made, line, index + 1, above, line.sign));
  const storey = line.storeys[index];
  if (storey === undefined) return terms;
  const held = design.outcome.diaphragms.some(({ rigid, given: gives }) => rigid !== undefined && gives.has(line));
  const parts = held ? given : [...(above === undefined ? [] : [above]), ...given];
  if (parts.length === 0) return terms;
  const below = steps.add(
    steps.fresh('V_below'),
    parts.map(({ symbol }) => symbol).join(' + '),
    parts,
    context.units.force,
    {
      what: `what goes into the piers of line ${line.line.id} below, with the diaphragm design force, along its axis`,
      clause: 'equilibrium of the line',
    },
  );
  return [...terms, ...along(made, line, index, below, line.sign < 0 ? 1 : -1)];
}

/** A line's shear in its piers: each by its share, evenly along it. */
function along(made: Collector, line: LineModel, level: number, shear: Value, sign: 1 | -1): Term[] {
  const { context, steps } = made;
  const storey = line.storeys[level];
  if (storey === undefined) return [];
  const id = context.model.levels[level]?.id ?? '';
  return storey.piers.flatMap((pier) => {
    const [from, to] = [tOn(line, pier.from), tOn(line, pier.to)];
    const low = Math.min(from, to);
    if (low >= made.place.t) return [];
    const share = storey.piers.length === 1 ? undefined : pierShare(context, { line, storey, level: id, pier }, steps);
    const force = steps.add(
      steps.fresh('P'),
      `${sign < 0 ? '−' : ''}${share === undefined ? '' : `${share.symbol}·`}${shear.symbol}`,
      share === undefined ? [shear] : [share, shear],
      context.units.force,
      { what: `pier ${pier.key}, along the line’s t` },
    );
    return stretch(made, force, from, to, pierPath(line, pier));
  });
}
