/** What a flexible diaphragm gives to a wall line. */
import { supportsOf } from '../diaphragms/flexible.js';
import type { DiaphragmOutcome } from '../path/descent.js';
import type { Demand } from '../path/result.js';
import type { LineModel } from '../walls/wall-line.js';
import { linePath, type Context } from './context.js';
import { floorParts } from './floor-parts.js';
import { pierLength, pierStiffness } from './piers.js';
import {
  forcesWithin,
  handedOver,
  onSupport,
  spanReach,
  spanSource,
  stoppedWithin,
  type SpanSource,
} from './span-steps.js';
import { sumOf, type Steps, type Value } from './steps.js';

/** What a flexible diaphragm gives to a wall line with the storey forces, along the line's axis. */
export function flexibleGives(
  context: Context,
  demand: Pick<Demand, 'case' | 'sense'>,
  outcome: DiaphragmOutcome,
  line: LineModel,
  steps: Steps,
  symbol: string,
): Value | undefined {
  const supports = supportsOf(outcome.diaphragm, line.family);
  const index = supports.findIndex((support) => support.lines.some((each) => each.line === line));
  const support = supports[index];
  if (support === undefined) return undefined;
  const pushes =
    outcome.pushed.inertia.frame === line.family ||
    [...outcome.taken.keys()].some((each) => each.family === line.family);
  if (!pushes) return undefined;
  const source = spanSource(context, demand, outcome, line.family, line.sign, 'force', steps);
  const parts = [
    ...(index > 0
      ? [handedOver(source, index - 1, 'far', forcesWithin(source, spanReach(source, index - 1)), steps.fresh('r'))]
      : []),
    ...(index + 1 < supports.length
      ? [handedOver(source, index, 'near', forcesWithin(source, spanReach(source, index)), steps.fresh('r'))]
      : []),
    ...straightInto(source, support.s),
  ];
  const share =
    support.lines.length > 1
      ? shareOfSupport(
          context,
          support.lines.map((each) => each.line),
          line,
          outcome,
          steps,
        )
      : undefined;
  const sum = sumOf(parts);
  return steps.add(
    symbol,
    share === undefined ? sum : `${share.symbol}·(${sum})`,
    share === undefined ? parts : [share, ...parts],
    context.units.force,
    { what: `what diaphragm ${outcome.diaphragm.key} gives to line ${line.line.id}, along its axis` },
  );
}

/** Façades and walls that stop, both at the place of the support itself. */
export function straightInto(source: SpanSource, s: number): Value[] {
  const { profile, push, context, outcome, steps } = source;
  const holds = (place: number): boolean => Math.abs(place - s) <= profile.tolerance && onSupport(source, place);
  const values: Value[] = [];
  if (push !== undefined) {
    for (const { size } of floorParts(context, outcome.pushed.inertia, { from: s, to: s, holds }, steps)) {
      values.push(
        steps.add(
          steps.fresh('f'),
          `${push.force.symbol}·${size.symbol}/${push.whole.symbol}`,
          [push.force, size, push.whole],
          context.units.force,
          { what: 'part of the level’s force that stands on the line itself' },
        ),
      );
    }
  }
  return [...values, ...stoppedWithin(source, { holds }).map(({ force }) => force)];
}

/** Lines of one plane share by stiffness where every pier states one, else by length. */
export function shareOfSupport(
  context: Context,
  lines: readonly LineModel[],
  own: LineModel,
  { diaphragm }: DiaphragmOutcome,
  steps: Steps,
): Value {
  const storeys = lines.map((line) => line.storeys[diaphragm.level]);
  const stiff = storeys.every((storey) => storey?.pierStiffness !== undefined);
  const level = context.model.levels[diaphragm.level]?.id ?? '';
  const weights = lines.map((line, i) => {
    const storey = storeys[i];
    const piers = (storey?.piers ?? []).map((pier, j) => {
      if (storey === undefined) throw new Error(`no storey of ${line.line.id}`);
      const place = { line, storey, level, pier };
      return stiff
        ? pierStiffness(context, place, `k_${j + 1}`, steps)
        : pierLength(context, place, steps.fresh('b'), steps);
    });
    return steps.add(steps.fresh('B'), sumOf(piers), piers, piers[0]?.unit ?? '1', { what: `of line ${line.line.id}` });
  });
  const mine = weights[lines.indexOf(own)] as Value;
  return steps.add(steps.fresh('c'), `${mine.symbol}/(${sumOf(weights)})`, weights, '1', {
    what: `part of line ${own.line.id} among the lines of its plane`,
    clause: `lines of one plane share by the ${stiff ? 'stiffness' : 'length'} of their piers (${linePath(own)})`,
  });
}
