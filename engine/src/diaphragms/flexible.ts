/** Flexible diaphragms: simple spans between adjacent wall lines. */
import { Refusal } from '../building/refusal.js';
import type { Profile } from '../geometry/profile.js';
import { simpleSpans, type SpanStatics } from '../statics/beam.js';
import type { SpanLoad } from '../statics/span-load.js';
import type { LineModel, StoreyModel } from '../walls/wall-line.js';
import type { DiaphragmModel } from './diaphragm.js';

/** Wall lines at one and the same `s`: one support. */
export type Support = {
  readonly s: number;
  /** Lines in order along t, with their part of the reaction; the parts add up to 1. */
  readonly lines: readonly { readonly line: LineModel; readonly part: number }[];
  /** Ids joined by `+`. */
  readonly name: string;
};

/** The supports of a diaphragm in a frame, ascending in s. */
export function supportsOf(diaphragm: DiaphragmModel, frame: number): Support[] {
  const tolerance = (diaphragm.profiles[frame] as Profile).tolerance;
  const lines = diaphragm.touches
    .map((touch) => touch.line)
    .filter((line) => line.family === frame && line.storeys[diaphragm.level] !== undefined)
    .sort((a, b) => a.s - b.s);
  const groups: LineModel[][] = [];
  for (const line of lines) {
    const last = groups[groups.length - 1];
    if (last !== undefined && line.s - (last[0] as LineModel).s <= tolerance) last.push(line);
    else groups.push([line]);
  }
  return groups.map((group) => {
    group.sort((a, b) => middle(a) - middle(b));
    const storeys = group.map((line) => line.storeys[diaphragm.level] as StoreyModel);
    const byStiffness = storeys.every((storey) => storey.pierStiffness !== undefined);
    const weights = storeys.map((storey) => (byStiffness ? (storey.pierStiffness as number) : storey.pierLength));
    const total = weights.reduce((sum, weight) => sum + weight, 0);
    return {
      s: (group[0] as LineModel).s,
      lines: group.map((line, i) => ({ line, part: (weights[i] as number) / total })),
      name: group.map((line) => line.line.id).join('+'),
    };
  });
}

function middle(line: LineModel): number {
  return line.t0 + (line.sign * line.length) / 2;
}

/**
 * A load on a flexible diaphragm, along the frame's t, carried to its supports.
 *
 * @throws Refusal `too-few-lines` when fewer than two lines hold the diaphragm in this direction
 */
export function flexibleSpans(
  diaphragm: DiaphragmModel,
  frame: number,
  supports: readonly Support[],
  load: SpanLoad,
): SpanStatics {
  if (supports.length < 2) throw new Refusal([tooFewLines(diaphragm, frame, supports)]);
  return simpleSpans(
    load,
    supports.map((support) => support.s),
    (diaphragm.profiles[frame] as Profile).tolerance,
  );
}

function tooFewLines(diaphragm: DiaphragmModel, frame: number, supports: readonly Support[]) {
  const [x, y] = (diaphragm.profiles[frame] as Profile).frame.t;
  const degrees = Math.round(((Math.atan2(y, x) * 180) / Math.PI) * 1e6) / 1e6;
  const only = supports[0];
  return {
    code: 'too-few-lines',
    path: diaphragm.path,
    found: `diaphragm ${diaphragm.key} held along ${degrees}° by ${only === undefined ? 'no wall line' : `line ${only.name} alone`}`,
    expected: 'two or more wall lines at different places for a flexible diaphragm',
    hint: 'add a wall line, or state its behaviour as rigid or semi-rigid',
  };
}
